import type { MissingReason } from '../model/missing.ts';
import type { Protocol } from '../model/protocol.ts';

/** What a number on a sheet stands for: a code, "none of them", or why there is no mark. */
export type PaperMeaning =
  | { readonly kind: 'code'; readonly code: string }
  | { readonly kind: 'none' }
  | { readonly kind: 'missing'; readonly reason: MissingReason };

export interface PaperNumber {
  readonly number: number;
  readonly means: PaperMeaning;
}

/** What an observer with a pencil can know; an empty line is missed. */
export const paperReasons: readonly MissingReason[] = [
  'left the room',
  'with another adult',
  'not taking part',
  'class interrupted',
  'other',
];

/** True where an interval holds a set of codes, which may be empty. */
export const severalCodes = ({ method }: Pick<Protocol, 'method'>): boolean =>
  method === 'partial' || method === 'whole';

/** True where "none of the codes" can be said. */
export const hasNone = ({ method }: Pick<Protocol, 'method'>): boolean =>
  method === 'partial' || method === 'whole' || method === 'duration';

/**
 * The numbers of a sheet, the same on paper and when it is typed in: the codes from 1 in the order of their set, then
 * "none of them" where there is such a thing; 0 for cannot see; reasons from 5 on, or from the next 11, 21 … where
 * there are more codes than that.
 */
export function paperNumbers(protocol: Pick<Protocol, 'method' | 'codeSet'>): PaperNumber[] {
  const codes = protocol.method === 'headcount' ? [] : protocol.codeSet.codes;
  const before: PaperMeaning[] = [
    ...codes.map(({ id }): PaperMeaning => ({ kind: 'code', code: id })),
    ...(hasNone(protocol) ? [{ kind: 'none' } as const] : []),
  ];
  const first = before.length <= 4 ? 5 : Math.ceil((before.length + 1) / 10) * 10 + 1;
  return [
    ...before.map((means, k) => ({ number: k + 1, means })),
    { number: 0, means: { kind: 'missing', reason: 'out of view' } },
    // A child who is away keeps nobody from counting the others.
    ...paperReasons.flatMap((reason, k): PaperNumber[] =>
      protocol.method === 'headcount' && k < 3
        ? []
        : [{ number: first + k, means: { kind: 'missing', reason } }],
    ),
  ];
}
