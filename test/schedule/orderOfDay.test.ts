import { describe, expect, it } from 'vitest';
import type { Child } from '../../src/model/classroom.ts';
import type { Protocol } from '../../src/model/protocol.ts';
import { drawChildren } from '../../src/schedule/drawChildren.ts';
import { type DayWish, orderOfDay } from '../../src/schedule/orderOfDay.ts';
import { protocolOf } from '../support/session.ts';

const children: Child[] = Array.from({ length: 10 }, (_, i) => ({
  id: `c${i}`,
  pseudonym: `Otter-0${i}`,
  stratum: null,
  removed: i === 9,
}));
const present = children.filter(({ removed }) => !removed);
const draw = drawChildren(present, 4, 2, 'seed');
const { chosen, reserves } = draw;
const outside = present.map(({ id }) => id).filter((id) => ![...chosen, ...reserves].includes(id));

const day = (changes: Partial<Protocol>, wish: Partial<DayWish> = {}, drawn: typeof draw | null = draw) =>
  orderOfDay(
    protocolOf({ order: 'random', childrenToDraw: 4, ...changes }),
    { draw: drawn, children },
    { absent: new Set(), first: null, orderSeed: 'order', parts: 2, ...wish },
  );

describe('who is watched today, in which order', () => {
  it('is everybody who is there in a headcount, drawn or not, without chance', () => {
    const counted = day({ method: 'headcount' }, { absent: new Set(['c3']) }, null);
    expect(counted.children).toEqual(present.map(({ id }) => id).filter((id) => id !== 'c3'));
    expect(counted).toMatchObject({ reserves: [], replaced: [], orderSeed: null, turns: undefined });
  });

  it('is the drawn children by chance, or as drawn', () => {
    const byChance = day({});
    expect([...byChance.children].sort()).toEqual([...chosen].sort());
    expect(byChance.orderSeed).toBe('order');
    expect(day({}).children).toEqual(byChance.children);
    expect(day({ order: 'listed' })).toMatchObject({ children: chosen, reserves, orderSeed: null });
  });

  it('is one child by chance where one is watched; the others wait in order', () => {
    const one = day({ rotation: { kind: 'one' } });
    expect(one.children).toHaveLength(1);
    expect(one.reserves.slice(0, 3).sort()).toEqual(chosen.filter((id) => id !== one.children[0]).sort());
    expect(one.reserves.slice(3)).toEqual(reserves);
    expect(day({ method: 'duration', childrenToDraw: 1 }).children).toEqual(chosen.slice(0, 1));
  });

  it('puts a chosen target first and shuffles the others, with their turns', () => {
    const target = {
      rotation: { kind: 'target' as const, peerEvery: 4 },
      order: 'random each round' as const,
    };
    const wanted = chosen[2] ?? '';
    const made = day(target, { first: wanted });
    expect(made.children[0]).toBe(wanted);
    expect([...made.children].sort()).toEqual([...chosen].sort());
    expect(made.turns?.map((part) => part.slice(0, 3))).toEqual([
      [0, 0, 0],
      [0, 0, 0],
    ]);
  });

  it('takes a target that was not drawn, in the place of the last drawn one, who waits', () => {
    const [stranger = ''] = outside;
    const made = day({ rotation: { kind: 'target', peerEvery: 4 }, order: 'listed' }, { first: stranger });
    expect(made.children).toEqual([stranger, ...chosen.slice(0, 3)]);
    expect(made.reserves[0]).toBe(chosen[3]);
  });

  it('asks nobody to be drawn where the only child is chosen', () => {
    expect(day({ method: 'duration' }, { first: 'c5' }, null).children).toEqual(['c5']);
    expect(day({ method: 'duration' }, {}, null).children).toEqual([]);
  });

  it('heeds no choice where nobody stands out, and none of a child who is away', () => {
    expect(day({}, { first: chosen[3] ?? '' }).children).toEqual(day({}).children);
    const away = chosen[0] ?? '';
    const made = day({ rotation: { kind: 'one' } }, { first: away, absent: new Set([away]) });
    expect(made.children).not.toContain(away);
  });
});
