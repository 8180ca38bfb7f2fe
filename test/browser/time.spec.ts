import type { CDPSession, Page } from '@playwright/test';

import { readOut } from '../../src/journal/readOut.ts';
import { fold } from '../../src/journal/step.ts';
import { expectHeardAsTold } from './support/heardAsTold.ts';
import { listen, soundsOf } from './support/hearing.ts';

import { headerOnDisk, journalOnDisk, sessionOf } from './support/kept.ts';
import { goIn, lookingAt, start } from './support/observing.ts';
import {
  clockGaps,
  cuedOf,
  cuesWritten,
  expectOnGrid,
  expectPunctual,
  gapsOf,
  prompts,
  visit,
} from './support/promptsTold.ts';
import {
  contextsMade,
  holdSoundDown,
  movableWallClock,
  moveWallClock,
  rememberContexts,
  stopSound,
} from './support/soundSource.ts';
import { expect, test } from './support/test.ts';

test.use({
  tabletOptions: {
    bypassPolicy: true,
    prepare: async (context) => {
      await listen(context, 200);
      await context.addInitScript(rememberContexts);
      await context.addInitScript(movableWallClock);
    },
  },
});

/** Into the room, and on until the first child is looked at. */
async function recording(page: Page, key: string): Promise<string> {
  await goIn(page, await visit(key));
  await start(page);
  await lookingAt(page, 'Otter-01');
  return sessionOf(page);
}

test('sound that is stopped from outside comes back by itself; the screen cues meanwhile, nothing is missing', async ({
  tablet,
}) => {
  const page = await tablet.visitOnce();
  const session = await recording(page, 'stopped');
  const contexts = await page.evaluate(contextsMade);
  await page.evaluate(stopSound);
  await cuesWritten(page, session, 5);
  const journal = await journalOnDisk(page, session);
  expectOnGrid(journal);
  expect(cuedOf(journal).every(({ by }) => by.includes('screen'))).toBe(true);
  expect(cuedOf(journal).at(-1)?.by).toEqual(['sound', 'screen']);
  // It was noticed and is over within two seconds, and no cue was lost to it.
  expect(gapsOf(journal)).toContainEqual(expect.objectContaining({ cause: 'sound', estimated: false }));
  expect(gapsOf(journal).filter(({ cause, from, to }) => cause !== 'sound' || to > from)).toEqual([]);
  expect(await page.evaluate(contextsMade)).toBe(contexts);
  const marked = readOut(fold(await headerOnDisk(page, session), journal));
  expect(marked.filter(({ missing }) => missing === 'prompt failed')).toEqual([]);
});

test('sound that never comes back is made anew, on the same grid', async ({ tablet }) => {
  const page = await tablet.visitOnce();
  const session = await recording(page, 'held down');
  const before = await page.evaluate(contextsMade);
  await page.evaluate(holdSoundDown);
  const held = (await journalOnDisk(page, session)).length;
  await page.waitForFunction(
    (count) => (window as unknown as { contexts: unknown[] }).contexts.length > count,
    before,
  );
  const told = cuedOf(await journalOnDisk(page, session)).length;
  await cuesWritten(page, session, told + 4);
  const journal = await journalOnDisk(page, session);
  expectOnGrid(journal);
  expect(new Set(gapsOf(journal).map(({ cause }) => cause))).toEqual(new Set(['sound']));
  expect(cuedOf(journal).at(-1)?.by).toEqual(['sound', 'screen']);
  expect(await page.evaluate(contextsMade)).toBe(before + 1);
  // The new context is heard, prompt by prompt.
  const fresh = prompts(await soundsOf(page), before, false);
  expect(fresh.length).toBeGreaterThanOrEqual(2);
  expectHeardAsTold(fresh, journal.slice(held));
});

test('a processor twenty times slower bends no prompt', async ({ tablet }) => {
  const page = await tablet.visitOnce();
  const session = await recording(page, 'slow');
  const cdp: CDPSession = await tablet.context.newCDPSession(page);
  await cdp.send('Emulation.setCPUThrottlingRate', { rate: 20 });
  const told = cuedOf(await journalOnDisk(page, session)).length;
  await cuesWritten(page, session, told + 4);
  await cdp.send('Emulation.setCPUThrottlingRate', { rate: 1 });
  await cuesWritten(page, session, told + 5);
  const journal = await journalOnDisk(page, session);
  expectOnGrid(journal);
  expectPunctual(journal);
  expect(gapsOf(journal).filter(({ cause }) => cause !== 'sound')).toEqual([]);
  const last = (await page.evaluate(contextsMade)) - 1;
  const heard = prompts(await soundsOf(page), last, true);
  expect(heard.length).toBeGreaterThanOrEqual(5);
  expectHeardAsTold(heard, journal);
});

test('a machine that stands still for a moment bends no prompt after it, and it is written down', async ({
  tablet,
}) => {
  const page = await tablet.visitOnce();
  const session = await recording(page, 'standstill');
  // A test tone, three ticks and two prompts are over: none sounds meanwhile.
  await soundsOf(page, 1 + 3 + 2);
  tablet.standStill(400);
  await cuesWritten(page, session, 6);
  const journal = await journalOnDisk(page, session);
  expectOnGrid(journal);
  expect(gapsOf(journal).map(({ cause, from, to }) => [cause, to - from])).toContainEqual(['sound', 0]);
  expect(cuedOf(journal).every(({ by }) => by.includes('sound'))).toBe(true);
  const last = (await page.evaluate(contextsMade)) - 1;
  expectHeardAsTold(prompts(await soundsOf(page), last, true), journal);
});

test('a wall clock that is set forth and back shifts nothing, and is written down both times', async ({
  tablet,
}) => {
  const page = await tablet.visitOnce();
  const session = await recording(page, 'wall clock');
  const noticed = (count: number) =>
    expect
      .poll(async () => clockGaps(await journalOnDisk(page, session)).length, {
        timeout: 2000,
        intervals: [50],
      })
      .toBe(count);
  await page.evaluate(moveWallClock, 3_600_000);
  await noticed(1);
  await cuesWritten(page, session, 3);
  await page.evaluate(moveWallClock, -7_200_000);
  await noticed(2);
  await cuesWritten(page, session, 6);
  const journal = await journalOnDisk(page, session);
  expectOnGrid(journal);
  expect(clockGaps(journal).map(({ from, to }) => to - from)).toEqual([0, 0]);
  expect(gapsOf(journal).filter(({ cause }) => cause !== 'sound')).toHaveLength(2);
  expectPunctual(journal);
  // Written as the clock stood: the journal is ordered by number.
  const walls = journal.map(({ wall }) => Date.parse(wall));
  expect(Math.max(...walls) - Math.min(...walls)).toBeGreaterThan(7_000_000);
  const last = (await page.evaluate(contextsMade)) - 1;
  expectHeardAsTold(prompts(await soundsOf(page), last, true), journal);
});
