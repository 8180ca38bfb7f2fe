// @vitest-environment happy-dom
import { cleanup, screen } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import type { EntryBody } from '../../../src/journal/entry.ts';
import { Afterwards } from '../../../src/screens/afterwards/Afterwards.tsx';
import { recordedBy } from '../../analysis/recordedPair.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { emptyStudy, must } from '../support/studyOf.ts';

afterEach(cleanup);

async function timing(
  silent: boolean,
  more: readonly (readonly [number, EntryBody])[] = [],
): Promise<string> {
  const services = fakeServices();
  await emptyStudy(services);
  const { header, journal } = recordedBy('Quill', { looks: '1'.repeat(30), silent, more });
  must(await services.store.createSession(header));
  must(await services.store.appendEntries(header.id, journal));
  renderScreen(<Afterwards />, services, '/afterwards/session/Quill');
  const heading = await screen.findByRole(
    'heading',
    { level: 2, name: 'How well the prompts kept time' },
    { timeout: 10_000 },
  );
  const text = heading.closest('section')?.textContent ?? '';
  expect(text).not.toMatch(/NaN|null|undefined/);
  return text;
}

test('one word, and the figures behind it', async () => {
  const text = await timing(false);
  expect(text).toContain('Reliable');
  expect(text).toContain('Every prompt was heard, on its moment.');
  expect(text).toContain('30 prompts: 30 heard.');
  expect(text).toContain(
    'A mark came 0.9 s after its prompt (median of 30 first marks), nine in ten within 0.9 s',
  );
  expect(text).toContain('No mark came late.');
  expect(text).toContain('The tablet never stood still.');
});

test('what stands against it is listed, with the time of day', async () => {
  const text = await timing(false, [
    [0, { kind: 'clockNudged', by: -80 }],
    [100_000, { kind: 'gap', from: 97_500, to: 100_000, cause: 'closed', estimated: true }],
    [200_000, { kind: 'gap', from: 200_000, to: 200_000, cause: 'hidden', estimated: false }],
  ]);
  expect(text).toContain('With care');
  expect(text).toContain('After 1 gap the time was set by the tablet’s clock, so it is an estimate.');
  expect(text).toContain(
    '10:01: the tablet was closed or without power, and 2.5 s of the schedule ran by (estimated).',
  );
  expect(text).toContain('10:03: the page was hidden; no prompt was lost.');
  expect(text).toContain('The tick check set this tablet’s clock 80 ms back.');
});

test('prompts that came to nobody make it not reliable', async () => {
  const failed = [31, 32].map((interval): [number, EntryBody] => [
    450_000,
    { kind: 'cued', interval: interval - 20, cue: 'look', planned: 1, delivered: null, by: [] },
  ]);
  const text = await timing(false, failed);
  expect(text).toContain('Not reliable');
  expect(text).toContain('The prompts of 2 of 30 intervals came to nobody, or not all of them.');
});

test('without prompts nothing is said of them', async () => {
  expect(await timing(true)).toContain('This record holds no prompts, so their timing is not known.');
});
