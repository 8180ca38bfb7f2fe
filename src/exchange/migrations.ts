/** An envelope as it was read, of whatever version. */
export type Envelope = Readonly<Record<string, unknown>>;

/** Brings an envelope of one version to the next one. Pure and total: the schema looks at the result. */
export type Migration = (envelope: Envelope) => Envelope;

/**
 * The steps, by the version that they start from. Version 1 is the first one, so there are none yet. A new version
 * adds its step here, and a file of the old one to the frozen files, which are never written anew.
 */
export const migrations: Readonly<Record<number, Migration>> = {};

/** Takes an envelope through every step from its own version up to `to`, and says so in it. */
export function migrate(
  envelope: Envelope,
  from: number,
  to: number,
  steps: Readonly<Record<number, Migration>> = migrations,
): Envelope {
  let result = envelope;
  for (let version = from; version < to; version++) result = steps[version]?.(result) ?? result;
  return from < to ? { ...result, version: to } : result;
}
