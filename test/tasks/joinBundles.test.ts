import fc from 'fast-check';
import { expect, it } from 'vitest';
import type { Classroom } from '../../src/model/classroom.ts';
import { joinBundles } from '../../src/tasks/joinBundles.ts';
import type { StudyBundle } from '../../src/tasks/ports.ts';
import { openedMemory } from '../storage/opened.ts';
import { bundleOf, classOf, given, journalOf, revision, studyOf } from '../storage/samples.ts';
import { headerOf } from '../support/session.ts';

const state = fc.record({ counter: fc.integer({ min: 0, max: 3 }), writer: fc.constantFrom('a', 'b') });

/** A record is made by its revision, as it is in life: one writer's one edit has one content. */
const classroom = fc.record({ id: fc.constantFrom('class-1', 'class-2'), state, gone: fc.boolean() }).map(
  ({ id, state: { counter, writer }, gone }): Classroom =>
    classOf({
      id,
      name: `${id} ${counter} ${writer}`,
      revision: revision(counter, writer),
      children: [{ id: `${id} child`, pseudonym: 'Otter-01', stratum: null, removed: gone && counter > 1 }],
    }),
);

const session = fc
  .record({
    id: fc.constantFrom('session-1', 'session-2'),
    from: fc.integer({ min: 0, max: 5 }),
    to: fc.integer({ min: 0, max: 9 }),
  })
  .map(({ id, from, to }) => ({
    header: headerOf({}, ['before'], { id }),
    journal: journalOf(id, 8, true).slice(from, to),
  }));

const bundle: fc.Arbitrary<StudyBundle> = fc
  .record({
    state,
    classes: fc.array(classroom, { maxLength: 3 }),
    sessions: fc.array(session, { maxLength: 3 }),
  })
  .map(({ state: { counter, writer }, classes, sessions }) =>
    bundleOf({
      study: studyOf({ name: `Study ${counter} ${writer}`, revision: revision(counter, writer) }),
      classes,
      sessions,
    }),
  );

async function after(bundles: readonly StudyBundle[]) {
  const { store } = await openedMemory();
  for (const one of bundles) given(await store.applyBundles([one], joinBundles));
  return given(await store.bundle('study-1'));
}

it('gives the same study through the store in whatever order, and however often, files come in', async () => {
  await fc.assert(
    fc.asyncProperty(fc.array(bundle, { minLength: 1, maxLength: 4 }), fc.nat(), async (bundles, turn) => {
      const once = await after(bundles);
      const k = turn % bundles.length;
      expect(await after([...bundles.slice(k), ...bundles.slice(0, k)])).toEqual(once);
      expect(await after([...bundles].reverse())).toEqual(once);
      expect(await after([...bundles, ...bundles])).toEqual(once);
    }),
    { numRuns: 60 },
  );
});

it('gives the same whether files come one by one or together', async () => {
  await fc.assert(
    fc.asyncProperty(fc.array(bundle, { minLength: 1, maxLength: 4 }), async (bundles) => {
      const { store } = await openedMemory();
      given(await store.applyBundles(bundles, joinBundles));
      expect(given(await store.bundle('study-1'))).toEqual(await after(bundles));
    }),
    { numRuns: 40 },
  );
});
