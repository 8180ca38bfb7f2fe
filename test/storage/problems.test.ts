import { expect, it } from 'vitest';
import { answer, isLost, problemOf, StoreFailure } from '../../src/storage/problems.ts';

const named = (name: string, more: object = {}): Error =>
  Object.assign(new Error(`said by ${name}`), { name, ...more });

it.each([
  [named('AbortError', { inner: named('QuotaExceededError') }), 'store.full'],
  [named('AbortError', { inner: named('AbortError', { cause: named('QuotaExceededError') }) }), 'store.full'],
  [named('BulkError', { failures: [named('ConstraintError'), named('QuotaExceededError')] }), 'store.full'],
  [named('UnknownError', { message: 'The disk is full' }), 'store.full'],
  [named('AbortError'), 'store.failed'],
  [named('VersionError'), 'store.newer'],
  [named('OpenFailedError', { inner: named('SecurityError') }), 'store.refused'],
  [named('MissingAPIError'), 'store.refused'],
  [named('DatabaseClosedError'), 'store.lost'],
  [new DOMException('closing', 'InvalidStateError'), 'store.lost'],
  [new StoreFailure('store.noSession'), 'store.noSession'],
])('finds the cause inside of what the database throws: %s', (error, code) => {
  expect(problemOf(error)?.code).toBe(code);
});

it('takes an error of our own for a bug, and lets it through', async () => {
  expect(problemOf(new TypeError('x is undefined'))).toBeNull();
  expect(isLost(new TypeError('x is undefined'))).toBe(false);
  const bug = (): Promise<never> => Promise.reject(new TypeError('x is undefined'));
  await expect(answer(bug)).rejects.toThrow(TypeError);
});

it('does not walk in circles', () => {
  const error = named('AbortError') as Error & { inner?: unknown };
  error.inner = error;
  expect(problemOf(error)?.code).toBe('store.failed');
});
