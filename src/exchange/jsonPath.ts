/** `$.sessions[2].header.observer`, as RFC 9535 writes paths. */
export function jsonPath(parts: readonly PropertyKey[]): string {
  return parts.reduce<string>((path, part) => {
    if (typeof part === 'number') return `${path}[${part}]`;
    const name = String(part);
    return /^[A-Za-z_][A-Za-z0-9_]*$/.test(name)
      ? `${path}.${name}`
      : `${path}[${JSON.stringify(name.slice(0, 60))}]`;
  }, '$');
}

/** The value at a path; undefined where there is none. */
export function valueAt(root: unknown, parts: readonly PropertyKey[]): unknown {
  let value = root;
  for (const part of parts) {
    if (value === null || typeof value !== 'object') return undefined;
    value = (value as Record<PropertyKey, unknown>)[part];
  }
  return value;
}
