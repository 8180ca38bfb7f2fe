import { createHash } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { toBase32 } from '../../src/exchange/base32.ts';
import { cardDictionary } from '../../src/exchange/cardDictionary.ts';
import {
  addParts,
  type CardParts,
  missingParts,
  splitContent,
  writePart,
} from '../../src/exchange/cardParts.ts';
import type { CardProblemValues } from '../../src/exchange/cardProblems.ts';
import { packTree } from '../../src/exchange/packTree.ts';
import { type PairingCard, readPairingCard, writePairingCard } from '../../src/exchange/pairingCard.ts';
import { qrMatrix } from '../../src/exchange/qrMatrix.ts';
import { canonicalJson } from '../../src/kernel/canonicalJson.ts';
import { newId } from '../../src/kernel/ids.ts';
import { seededRandom } from '../../src/kernel/random.ts';
import type { Result } from '../../src/kernel/result.ts';
import { type VisitPlan, visitPlan } from '../../src/model/visitPlan.ts';
import { cardProblems } from '../../src/words/en/pairing.ts';
import type { Format } from '../../src/words/format.ts';
import { codeOf, given } from '../storage/samples.ts';
import { protocolOf } from '../support/session.ts';
import { preparedVisit } from './cardVisits.ts';

const pairs = (columns: number, rows: number) => ({ kind: 'pairs', columns, rows }) as const;
const small = await preparedVisit({ children: 8, plan: pairs(2, 2) });
const usual = await preparedVisit({ children: 30, plan: pairs(5, 3) });

const cardOf = async (plan: VisitPlan): Promise<PairingCard> => given(await writePairingCard(plan));

/** Reads texts one after the other, to the end or to the first refusal. */
async function read(...texts: readonly string[]): Promise<Result<VisitPlan>> {
  let have: CardParts | null = null;
  for (const text of texts) {
    const added = addParts(have, text);
    if (!added.ok) return added;
    have = added.value;
  }
  return have === null ? Promise.reject(new Error('nothing to read')) : readPairingCard(have);
}

describe('what is written is read', () => {
  it('comes back byte for byte, from its pictures and from its text', async () => {
    for (const plan of [small, usual]) {
      const card = await cardOf(plan);
      expect(canonicalJson(given(await read(...card.parts)))).toBe(canonicalJson(plan));
      expect(canonicalJson(given(await read(card.text)))).toBe(canonicalJson(plan));
    }
  });

  it('is the same card for the same visit, and another one for another visit', async () => {
    const again = JSON.parse(canonicalJson(usual)) as VisitPlan;
    expect(await cardOf(again)).toEqual(await cardOf(usual));
    expect((await cardOf({ ...usual, orderSeed: 'other' })).card).not.toBe((await cardOf(usual)).card);
  });

  it('holds for any visit, with members that only a newer program knows', async () => {
    await fc.assert(
      fc.asyncProperty(anyPlan, async (plan) => {
        expect(visitPlan.safeParse(plan).success).toBe(true);
        const card = await writePairingCard(plan);
        if (!card.ok) return expect(card.problem.code).toBe('card.tooLarge');
        const order = seededRandom(card.value.card);
        const shuffled = [...card.value.parts, ...card.value.parts].sort(() => order() - 0.5);
        expect(canonicalJson(given(await read(...shuffled)))).toBe(canonicalJson(plan));
        expect(canonicalJson(given(await read(card.value.text)))).toBe(canonicalJson(plan));
      }),
      { numRuns: 60 },
    );
  });

  it('is read in small letters, broken into lines, in groups, and with words around it', async () => {
    const { text, parts } = await cardOf(small);
    const spoilt = [
      text.toLowerCase(),
      text.replace(/(.{5})/g, '$1 '),
      text.replace(/(.{60})/g, '$1\r\n'),
      `The card for Thursday:\n\n${text}\nSee you there`,
      text.replaceAll('O', '0').replaceAll('I', '1').replace('LB', 'lb'),
      `  ${[...parts].reverse().join('\n')}\t`,
    ];
    for (const one of spoilt) expect(canonicalJson(given(await read(one)))).toBe(canonicalJson(small));
  });

  it('may go on from pictures to the text and the reverse', async () => {
    const { text, parts } = await cardOf(usual);
    const first = parts[0] ?? '';
    expect(canonicalJson(given(await read(first, text)))).toBe(canonicalJson(usual));
    expect(canonicalJson(given(await read(text, first)))).toBe(canonicalJson(usual));
  });

  it('knows which pictures are missing, in any order and with repeats', async () => {
    const { parts } = await cardOf(usual);
    const [one = '', two = '', ...others] = parts;
    let have = given(addParts(null, two));
    expect([have.of, missingParts(have)]).toEqual([parts.length, [1, ...others.map((_, i) => i + 3)]]);
    have = given(addParts(have, two));
    for (const other of others) have = given(addParts(have, other));
    expect(missingParts(have)).toEqual([1]);
    const early = await readPairingCard(have);
    expect(early).toMatchObject({
      ok: false,
      problem: { code: 'card.missing', values: { missing: '1', of: parts.length } },
    });
    expect(missingParts(given(addParts(have, one)))).toEqual([]);
  });
});

describe('what is broken is refused', () => {
  it('tells a card of a newer version, of the frame or of the content', async () => {
    const { text } = await cardOf(small);
    expect(await read(text.replace('LB1', 'LB2'))).toMatchObject({
      problem: { code: 'card.newer', values: { version: 2, known: 1 } },
    });
    expect(await read(rawCard([7, small]))).toMatchObject({
      problem: { code: 'card.newer', values: { version: 7, known: 1 } },
    });
  });

  it('tells what is no card from one that is cut off', async () => {
    const { text } = await cardOf(small);
    expect(await read('https://example.org/menu')).toMatchObject({
      problem: { code: 'card.otherCode', values: { found: 'https://example.org/menu' } },
    });
    expect(codeOf(await read('   '))).toBe('card.otherCode');
    for (const length of [3, 4, 9, 14, 16, 17, 60, text.length - 1])
      expect([length, codeOf(await read(text.slice(0, length)))]).toEqual([length, 'card.cutOff']);
  });

  it('refuses parts of another card, and keeps what was read', async () => {
    const [one = ''] = (await cardOf(usual)).parts;
    const have = given(addParts(null, one));
    const other = addParts(have, (await cardOf(small)).parts[0] ?? '');
    expect(codeOf(other)).toBe('card.otherCard');
    expect([...have.parts.keys()]).toEqual([1]);
  });

  it('never takes a wrong character for another visit', async () => {
    const { text } = await cardOf(small);
    const characters = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ234567019.:$% \n';
    await fc.assert(
      fc.asyncProperty(
        fc.nat(text.length - 1),
        fc.constantFrom(...characters),
        fc.constantFrom('wrong', 'more', 'absent'),
        async (at, character, kind) => {
          const spoilt =
            text.slice(0, at) +
            (kind === 'absent' ? '' : character) +
            text.slice(kind === 'more' ? at : at + 1);
          const answer = await read(spoilt);
          if (answer.ok) expect(canonicalJson(answer.value)).toBe(canonicalJson(small));
          else expect(answer.problem.code).toMatch(/^card\.(damaged|line|cutOff|otherCode|newer|missing)$/);
        },
      ),
      { numRuns: 300 },
    );
  });

  it('says which line of a typed text is wrong', async () => {
    const { text } = await cardOf(small);
    const lines = text.split('\n');
    const told = async (change: (lines: string[]) => void) => {
      const typed = [...lines];
      change(typed);
      const answer = await read(typed.join('\n'));
      return answer.ok ? null : { code: answer.problem.code, line: answer.problem.values.line };
    };
    const seventh = lines[7] ?? '';
    const other = (character: string | undefined) => (character === 'A' ? 'C' : 'A');
    const swapped = `${seventh.slice(0, 3)}${seventh[4]}${seventh[3]}${seventh.slice(5)}`;
    expect(seventh[3]).not.toBe(seventh[4]);
    const seen = { code: 'card.line', line: 7 };
    expect(await told((typed) => typed.splice(7, 1, `${other(seventh[0])}${seventh.slice(1)}`))).toEqual(
      seen,
    );
    expect(await told((typed) => typed.splice(7, 1, swapped))).toEqual(seen);
    expect(await told((typed) => typed.splice(7, 1, seventh.slice(1)))).toEqual(seen);
    expect(
      await told((typed) => typed.splice(7, 1, seventh.replace(/.:$/, `${other(seventh.at(-2))}:`))),
    ).toEqual(seen);
    expect(await told((typed) => typed.splice(7, 1))).toEqual(seen);
    expect(await told((typed) => typed.splice(7, 0, seventh))).toEqual({ code: 'card.line', line: 8 });
    expect(await told(() => undefined)).toBeNull();
  });

  it('refuses numbers that cannot be, and one number with two contents', async () => {
    const { card, parts } = await cardOf(usual);
    const content = Uint8Array.of(1, 2, 3, 4, 5);
    for (const [number, of] of [
      [0, 3],
      [4, 3],
      [1, 0],
      [1, 61],
    ] as const)
      expect(codeOf(addParts(null, writePart(card, number, of, content)))).toBe('card.damaged');
    expect(codeOf(addParts(null, writePart('SHORT', 1, 2, content)))).toBe('card.damaged');
    const have = given(addParts(null, parts[0] ?? ''));
    expect(codeOf(addParts(have, writePart(card, 1, parts.length, content)))).toBe('card.damaged');
    expect(codeOf(addParts(have, writePart(card, 1, parts.length + 1, content)))).toBe('card.damaged');
  });

  it('refuses a content that is intact and no visit, and says what was expected', async () => {
    const { children: _, ...lacking } = small;
    expect(await read(rawCard([1, lacking]))).toMatchObject({
      problem: { code: 'json.absent', values: { path: '$.visit.children' } },
    });
    expect(codeOf(await read(rawCard({ visit: small })))).toBe('card.damaged');
  });

  it('does not draw a visit that would take too many pictures', async () => {
    const random = seededRandom('large');
    const noise = () => Array.from({ length: 9000 }, () => String.fromCharCode(33 + random() * 90)).join('');
    const codes = Array.from({ length: 5 }, (_, i) => ({
      id: `code-${i}`,
      label: `code ${i}`,
      role: 'other' as const,
      definition: noise(),
      examples: '',
      nonExamples: '',
    }));
    const protocol = { ...small.schedule.protocol, codeSet: { name: 'Long', codes } };
    const large = await writePairingCard({ ...small, schedule: { ...small.schedule, protocol } });
    expect(large).toMatchObject({ ok: false, problem: { code: 'card.tooLarge', values: { most: 60 } } });
  });

  it('has a sentence for every refusal', () => {
    // The compiler asks for each, with its values.
    const all: {
      readonly [Code in keyof CardProblemValues]:
        | string
        | ((v: CardProblemValues[Code], f: Format) => string);
    } = cardProblems;
    expect(Object.keys(all)).toHaveLength(10);
  });
});

describe('how large it is', () => {
  it('takes few pictures, each small enough for a camera', async () => {
    const sizes: string[] = [];
    for (const [what, plan, most] of [
      ['8 children, 8 seats', small, 2],
      ['30 children, 30 seats, 6 drawn', usual, 3],
      ['30 children, no plan', await preparedVisit({ children: 30, plan: null }), 2],
      ['40 children, 60 seats', await preparedVisit({ children: 40, plan: pairs(6, 5) }), 5],
    ] as const) {
      const { parts, text } = await cardOf(plan);
      const modules = Math.max(...parts.map((part) => qrMatrix(part).size));
      sizes.push(`${what}: ${parts.length} pictures of ${modules} modules, ${text.length} characters`);
      expect(parts.length).toBeLessThanOrEqual(most);
      // Version 18 has 89 modules a side.
      expect(modules).toBeLessThanOrEqual(89);
    }
    console.info(sizes.join('\n'));
  });

  it('splits evenly, into whole groups of characters', () => {
    const lengths = (n: number) => splitContent(new Uint8Array(n)).map((piece) => piece.length);
    expect(lengths(1)).toEqual([1]);
    expect(lengths(495)).toEqual([495]);
    expect(lengths(496)).toEqual([250, 246]);
    expect(lengths(1500)).toEqual([375, 375, 375, 375]);
  });

  it('keeps the dictionary of version 1 for good', () => {
    expect(createHash('sha256').update(cardDictionary).digest('hex')).toMatchInlineSnapshot(
      `"a15fd4d12a048df8a16a26b8ad6f4ad5bbb6246b8c19b572bb5c9b6053d67950"`,
    );
  });
});

/** A card of any content, with checksums that are right. */
function rawCard(content: unknown): string {
  const digest = createHash('sha256').update(canonicalJson(content)).digest();
  const bytes = Uint8Array.from([...digest.subarray(5, 13), ...packTree(content)]);
  return writePart(toBase32(digest.subarray(0, 5)), 1, 1, bytes);
}

const random = seededRandom('any plan');
const id = fc.oneof(
  fc.constantFrom(...Array.from({ length: 12 }, () => newId(random))),
  fc.string({ minLength: 1, maxLength: 64 }),
);
const name = fc
  .string({ minLength: 1, maxLength: 200, unit: 'grapheme' })
  .filter((text) => text.length <= 200);
const orNull = <T>(one: fc.Arbitrary<T>) => fc.option(one, { nil: null });
const child = fc.record({ id, pseudonym: name, stratum: orNull(name) });
const seat = fc.record({
  id,
  column: fc.nat(19),
  row: fc.nat(19),
  table: fc.nat(50),
  child: orNull(id),
});
const unknown = fc.dictionary(
  fc.string().map((key) => `later ${key}`),
  fc.jsonValue({ maxDepth: 2 }),
  { maxKeys: 2 },
);
const anyPlan = fc
  .record({
    visit: id,
    study: fc.record({
      id,
      name,
      phases: fc.array(name, { maxLength: 3 }),
      conditions: fc.array(name, { maxLength: 3 }),
      lessonParts: fc.array(name, { maxLength: 4 }),
    }),
    classroom: fc.record({ id, name }),
    condition: orNull(name),
    plannedStart: orNull(fc.constantFrom('2026-11-03T10:40:00.000+00:00', '2026-11-03T10:40Z')),
    children: fc.array(child, { maxLength: 12 }),
    plan: orNull(
      fc.record({
        columns: fc.integer({ min: 1, max: 20 }),
        rows: fc.integer({ min: 1, max: 20 }),
        seats: fc.array(seat, { maxLength: 40 }),
        observerSide: fc.constantFrom('back' as const, 'left' as const),
      }),
    ),
    draw: orNull(
      fc.record({
        seed: name,
        method: fc.record({ name, version: fc.integer(), generator: name }),
        from: fc.array(id, { maxLength: 40 }),
        chosen: fc.array(id, { maxLength: 8 }),
        reserves: fc.array(id, { maxLength: 3 }),
      }),
    ),
    orderSeed: orNull(name),
    schedule: fc
      .record(
        {
          turns: fc.array(fc.array(fc.nat(11), { maxLength: 80 }), { maxLength: 2 }),
          phases: fc.array(name, { minLength: 1, maxLength: 2 }),
          later: unknown,
        },
        { requiredKeys: ['phases', 'later'] },
      )
      .map(({ later, ...rest }) => ({
        kind: 'laid' as const,
        protocol: { ...protocolOf(), ...later },
        ...rest,
        ...later,
      })),
    later: unknown,
  })
  .map(({ later, ...plan }): VisitPlan => ({ ...plan, ...later }));
