import { describe, expect, it } from 'vitest';
import type { Protocol } from '../../src/model/protocol.ts';
import { visitPlan } from '../../src/model/visitPlan.ts';
import { layOutSchedule } from '../../src/schedule/layOut.ts';
import {
  addChild,
  addClass,
  type ProtocolDraft,
  prepareVisit,
  saveProtocol,
  switchMethod,
  type VisitWish,
} from '../../src/tasks/index.ts';
import { codeOf, given } from '../storage/samples.ts';
import { type Bench, bench, type School, school } from './bench.ts';

type Changes = (draft: ProtocolDraft) => ProtocolDraft;

const draftOf = ({ version: _v, removed: _r, revision: _n, id: _id, ...draft }: Protocol): ProtocolDraft => ({
  ...draft,
  id: null,
  name: 'Another',
});

/** A visit of the school's class by a protocol of its own. */
async function prepared(changes: Changes, wish: Partial<VisitWish> = {}) {
  const on = await bench();
  const made = await school(on);
  return { on, made, answer: await visitBy(on, made, changes, wish) };
}

async function visitBy(on: Bench, made: School, changes: Changes, wish: Partial<VisitWish> = {}) {
  const protocol = given(await saveProtocol(on.deps, changes(draftOf(made.protocol))));
  return prepareVisit(on.deps, {
    classroom: made.classroom.id,
    protocol: { id: protocol.id },
    phases: ['before', 'after'],
    absent: [],
    plannedStart: null,
    orderSeed: 'order one',
    ...wish,
  });
}

describe('a visit prepared by each method', () => {
  it.each(['momentary', 'partial', 'whole'] as const)(
    '%s: the drawn children in order, turn by turn',
    async (method) => {
      const { made, answer } = await prepared((draft) => switchMethod(draft, method));
      const { plan } = given(answer);
      const drawn = made.classroom.draw?.chosen ?? [];
      expect(visitPlan.safeParse(plan).success).toBe(true);
      expect(plan.children.map(({ id }) => id).sort()).toEqual([...drawn].sort());
      const lines = layOutSchedule(
        plan.schedule,
        plan.children.map(({ id }) => id),
      );
      expect(lines).toHaveLength(120);
      expect(lines.slice(0, 6).map(({ child }) => child)).toEqual(plan.children.map(({ id }) => id));
    },
  );

  it('headcount: everybody who is there, nobody drawn, no order by chance', async () => {
    const { made, answer } = await prepared((draft) => switchMethod(draft, 'headcount'));
    const { plan } = given(answer);
    expect(plan.children).toHaveLength(made.classroom.children.length);
    expect(plan).toMatchObject({ draw: null, orderSeed: null });
    expect(plan.reserves).toBeUndefined();
    expect(layOutSchedule(plan.schedule, []).every(({ child }) => child === null)).toBe(true);
  });

  it('headcount: a class for which nothing was ever drawn can be counted, and nothing else', async () => {
    const on = await bench();
    const made = await school(on);
    const fresh = given(await addClass(on.deps, made.study.id, { name: 'Class Wren', condition: null }));
    const child = { pseudonym: 'Wren-01', stratum: null, consent: true };
    given(await addChild(on.deps, fresh.id, child));
    const wren = { ...made, classroom: fresh };
    const counted = await visitBy(on, wren, (draft) => ({
      ...switchMethod(draft, 'headcount'),
      name: 'Count',
    }));
    expect(given(counted).plan.children).toHaveLength(1);
    expect(codeOf(await visitBy(on, wren, (draft) => draft))).toBe('task.notDrawn');
  });

  it('duration: one child by chance, or the one that was chosen, drawn or not', async () => {
    const { made, on, answer } = await prepared((draft) => switchMethod(draft, 'duration'));
    const { plan } = given(answer);
    expect(plan.children.map(({ id }) => id)).toEqual(made.classroom.draw?.chosen.slice(0, 1));
    const other = made.classroom.children.find(({ id }) => !made.classroom.draw?.chosen.includes(id));
    const chosen = await visitBy(
      on,
      made,
      (draft) => ({ ...switchMethod(draft, 'duration'), name: 'Chosen' }),
      { first: other?.id ?? '' },
    );
    const lines = layOutSchedule(given(chosen).plan.schedule, [other?.id ?? '']);
    expect(given(chosen).plan.children.map(({ id }) => id)).toEqual([other?.id]);
    expect(lines).toHaveLength(2);
  });

  it('target: the chosen child first, its peers by chance, and the turns frozen', async () => {
    const target: Changes = (draft) => ({
      ...draft,
      rotation: { kind: 'target', peerEvery: 4 },
      order: 'random each round',
    });
    const { made, on, answer } = await prepared(target);
    const first = made.classroom.draw?.chosen[3] ?? '';
    expect(given(answer).plan.children).toHaveLength(6);
    const chosen = await visitBy(on, made, (draft) => ({ ...target(draft), name: 'Chosen' }), { first });
    const { plan } = given(chosen);
    const ids = plan.children.map(({ id }) => id);
    expect(ids[0]).toBe(first);
    const [part = []] = plan.schedule.turns ?? [];
    expect(part.slice(0, 3)).toEqual([0, 0, 0]);
    expect(
      layOutSchedule(plan.schedule, ids)
        .map(({ child }) => child)
        .slice(0, 60),
    ).toEqual(part.map((place) => ids[place]));
  });

  it('refuses a chosen child who is not there, and a target without peers', async () => {
    const target: Changes = (draft) => ({ ...draft, rotation: { kind: 'target', peerEvery: 4 } });
    const { made, on, answer } = await prepared(target, { first: 'a stranger' });
    expect(codeOf(answer)).toBe('task.firstNotThere');
    const [first = '', ...others] = made.classroom.children.map(({ id }) => id);
    const alone = await visitBy(on, made, (draft) => ({ ...target(draft), name: 'Alone' }), {
      first,
      absent: others,
    });
    expect(codeOf(alone)).toBe('task.targetAloneToday');
    const away = await visitBy(on, made, (draft) => ({ ...target(draft), name: 'Away' }), {
      first,
      absent: [first],
    });
    expect(codeOf(away)).toBe('task.firstNotThere');
  });
});
