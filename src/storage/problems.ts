import { type Problem, problem, type Result } from '../kernel/result.ts';

/** An expected failure on its way out of a transaction, which it rolls back. */
export class StoreFailure extends Error {
  readonly problem: Problem;
  constructor(code: string, values: Problem['values'] = {}) {
    super(code);
    this.name = 'StoreFailure';
    this.problem = { code, values };
  }
}

const full = ['QuotaExceededError', 'NS_ERROR_DOM_INDEXEDDB_QUOTA_ERR', 'NS_ERROR_FILE_NO_DEVICE_SPACE'];
const refused = ['SecurityError', 'NotAllowedError', 'MissingAPIError', 'MissingAPI', 'OpenFailedError'];
const lost = ['DatabaseClosedError', 'InvalidStateError', 'UnknownError', 'TransactionInactiveError'];
const storage = [
  ...['AbortError', 'TransactionAbortedError', 'TimeoutError', 'ReadOnlyError', 'ConstraintError'],
  ...['NotFoundError', 'BulkError', 'ModifyError', 'PrematureCommitError', 'DataError', 'NotReadableError'],
];

/**
 * All names and messages of an error and of what it hides: databases wrap the cause (`inner`, `cause`, `failures`,
 * the transaction's own error), and a full disk often comes as a bare abort with the cause inside.
 */
function layers(error: unknown): { name: string; message: string }[] {
  const found: { name: string; message: string }[] = [];
  const seen = new Set<unknown>();
  const walk = (value: unknown): void => {
    if (value === null || typeof value !== 'object' || seen.has(value)) return;
    seen.add(value);
    const layer = value as Record<string, unknown>;
    if (typeof layer.name === 'string')
      found.push({ name: layer.name, message: String(layer.message ?? '') });
    for (const member of ['inner', 'cause', 'error', 'reason', 'target', 'transaction']) walk(layer[member]);
    if (Array.isArray(layer.failures)) for (const failure of layer.failures) walk(failure);
  };
  walk(error);
  return found;
}

/** The problem that an error of the database stands for; null when it is none of the database's (a bug). */
export function problemOf(error: unknown): Problem | null {
  if (error instanceof StoreFailure) return error.problem;
  const all = layers(error);
  const named = (names: readonly string[]): boolean => all.some(({ name }) => names.includes(name));
  const [top] = all;
  if (named(full) || all.some(({ message }) => /quota|disk is full|no space/i.test(message)))
    return { code: 'store.full', values: {} };
  if (named(['VersionError'])) return { code: 'store.newer', values: {} };
  if (named(refused)) return { code: 'store.refused', values: { what: top?.message ?? '' } };
  if (named(lost)) return { code: 'store.lost', values: {} };
  if (named(storage)) return { code: 'store.failed', values: { what: `${top?.name}: ${top?.message}` } };
  return null;
}

/** True when the connection is gone and opening it anew may help. */
export function isLost(error: unknown): boolean {
  return problemOf(error)?.code === 'store.lost';
}

/** Runs something that touches the database: expected failures come back as values, bugs go on as exceptions. */
export async function answer<T>(work: () => Promise<T>): Promise<Result<T>> {
  try {
    return { ok: true, value: await work() };
  } catch (error) {
    const known = problemOf(error);
    if (known === null) throw error;
    return problem(known.code, known.values);
  }
}
