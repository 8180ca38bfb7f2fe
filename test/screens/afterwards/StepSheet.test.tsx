// @vitest-environment happy-dom
import { cleanup, screen, within } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { Afterwards } from '../../../src/screens/afterwards/Afterwards.tsx';
import { type Recorded, recordedBy } from '../../analysis/recordedPair.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { emptyStudy, must } from '../support/studyOf.ts';

afterEach(cleanup);

/** The sheet on which the verdict on Marsh's and Quill's step stands, found by its heading. */
async function verdict(name: string, marsh: Recorded, quill: Recorded): Promise<HTMLElement> {
  const services = fakeServices();
  await emptyStudy(services);
  for (const { header, journal } of [recordedBy('Marsh', marsh), recordedBy('Quill', quill)]) {
    must(await services.store.createSession(header));
    must(await services.store.appendEntries(header.id, journal));
  }
  renderScreen(<Afterwards />, services, '/afterwards/visit/Marsh');
  const heading = await screen.findByRole('heading', { level: 2, name }, { timeout: 10_000 });
  expect(document.body.textContent).not.toMatch(/NaN|null|undefined/);
  return heading.closest('section') ?? heading;
}

const seen = '1011010011101000110100111010110001011010';
const text = (sheet: HTMLElement) => sheet.textContent;

test('in step', async () => {
  const sheet = await verdict('In step.', { looks: seen }, { looks: seen, lag: () => -120 });
  expect(text(sheet)).toContain('By the tablets’ clocks their prompts came 0.1 s apart.');
  expect(text(sheet)).toContain('nobody seems to have lost the place');
  expect(text(sheet)).toContain('40 prompts compared, median −0.1 s, farthest −0.1 s (Quill less Marsh).');
  // Nothing to do, so nothing is asked for.
  expect(within(sheet).queryByText(/tick check/)).toBeNull();
});

test('seconds apart: who was later, what kappa was within reach, what to do', async () => {
  const sheet = await verdict('2.0 s apart.', { looks: seen }, { looks: seen, lag: () => 2000 });
  expect(text(sheet)).toContain('The prompts of Quill came 2.0 s after those of Marsh.');
  expect(text(sheet)).toContain('a kappa of .78 at best');
  expect(text(sheet)).toContain('Neither record holds a tick check');
  expect(text(sheet)).toContain('Next time bring both tablets together with the tick check');
});

test('apart from a moment on, after a tick check', async () => {
  const sheet = await verdict(
    '4.0 s apart from 10:05 on.',
    { looks: seen, more: [[0, { kind: 'clockNudged', by: -120 }]] },
    { looks: seen, lag: (i) => (i > 20 ? 4000 : 0) - 120 },
  );
  expect(text(sheet)).not.toContain('Neither record holds a tick check');
  expect(text(sheet)).toContain('It went from 0.0 s in the first five minutes to 4.0 s in the last.');
  expect(text(sheet)).toContain('Tick check: Marsh −120 ms.');
});

test('one place off, from about when until about when, and nobody is accused', async () => {
  const long = `${seen}0010110111000101010011001011010010110100`;
  const lost = `${long.slice(0, 10)}0${long.slice(10, 38)}${long.slice(39)}`;
  const sheet = await verdict(
    'One place off from about 10:02 until about 10:09.',
    { looks: long },
    { looks: lost },
  );
  expect(text(sheet)).toContain('It was one of the two; the marks cannot tell which.');
  expect(text(sheet)).toContain('It is not the clocks: the prompts came 0.0 s apart.');
  expect(text(sheet)).toMatch(
    /From about 10:02 until about 10:09: the same at \d+ of \d+ as the marks stand, and at \d+ of \d+ when those of Quill are read one place earlier\./,
  );
  expect(text(sheet)).toContain('Ask both what happened then.');
});

test('where one record alone has signs, they are named', async () => {
  const long = `${seen}0010110111000101010011001011010010110100`;
  const lost = `${long.slice(0, 10)}-${long.slice(10, 15)}-${long.slice(16, 38)}${long.slice(39)}`;
  const sheet = await verdict(
    'One place off from about 10:02 until about 10:09.',
    { looks: long },
    { looks: lost },
  );
  expect(text(sheet)).toContain('Just there Quill has 2 without a mark, Marsh nothing of the kind.');
});

test('simply disagreeing', async () => {
  const other = '1101110001011010100100110010110111011010';
  const sheet = await verdict('In step, and simply disagreeing.', { looks: seen }, { looks: other });
  expect(text(sheet)).toContain('they saw the same moment differently');
  expect(text(sheet)).toContain('Go through the differences with both of them');
});

test('what cannot be told says what is lacking', async () => {
  const sheet = await verdict(
    'Whether they were in step cannot be told.',
    { looks: '1101011010', silent: true },
    { looks: '0110100101', silent: true },
  );
  expect(text(sheet)).toContain('At least one record has no prompt times');
  expect(text(sheet)).toContain('too few looks that both scored');
});
