// @vitest-environment happy-dom
import { cleanup, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test } from 'vitest';
import { Afterwards } from '../../../src/screens/afterwards/Afterwards.tsx';
import { looksOf, type Row } from '../../analysis/sessionsFrom.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { studyOfTable } from '../support/studyOf.ts';

afterEach(cleanup);

// The worked class: six children, ten looks a phase, dots missing. Means 74.07 and 87.92, change 13.84 (SD 14.10),
// between −0.96 and 28.64, t(5) 2.405, p .061, g .603; variance (2(1 − r) + g²/2) / n = .126 with
// r .714 (worked out by hand).
const before = ['1101110110', '1110111011', '0101101010', '11111011.1', '1001.10011', '1111111111'];
const after = ['1111110111', '1111111011', '1101111010', '1111111111', '1111.1011.', '1111110111'];

function worked(klass: string, condition = ''): Row[] {
  const of = (phase: string, looks: readonly string[]): Row[] =>
    looksOf(
      { session: `${klass} ${phase}`, observer: 'Quill', class: klass, phase, condition },
      Object.fromEntries(looks.map((series, k) => [`${klass}-${k + 1}`, series])),
    );
  return [...of('before', before), ...of('after', after)];
}

async function shown(rows: readonly Row[], path = '/afterwards/change') {
  const services = fakeServices();
  await studyOfTable(services, rows);
  renderScreen(<Afterwards />, services, path);
  return (await screen.findByRole('heading', { level: 1 })).textContent;
}

test('one class without a comparison is described, and nothing more', async () => {
  expect(await shown(worked('Otter'))).toBe(
    'Otter was on-task 14 points more after than before: about 2 minutes in 15.',
  );
  expect(screen.getByText(/^Likely between −1 and \+29 points\. This describes one class/)).toBeTruthy();
  expect(document.body.textContent).not.toMatch(/effect of|caused|because of the break|significant/i);
  expect(
    screen.getByText('The figures describe lessons and groups. They say nothing about any one child.'),
  ).toBeTruthy();
});

test('two children with two looks each: no range is told that goes beyond any change', async () => {
  const of = (phase: string, looks: Record<string, string>): Row[] =>
    looksOf({ session: phase, observer: 'Quill', class: 'Otter', phase, condition: '' }, looks);
  // Changes of +100 and 0 points: 50 ± 12.7 · 50, by hand.
  await shown([
    ...of('before', { 'Otter-1': '00', 'Otter-2': '11' }),
    ...of('after', { 'Otter-1': '11', 'Otter-2': '11' }),
  ]);
  expect(screen.getByText(/^How sure this is cannot be told from so few: the range would go/)).toBeTruthy();
  expect(document.body.textContent).not.toMatch(/Likely between/);
});

test('the figures of the worked class; the paired t only for the analyst', async () => {
  await shown(worked('Otter'));
  const row = screen.getByRole('row', { name: /Otter/ });
  expect(row.textContent).toContain('74.1\u202f%');
  expect(row.textContent).toContain('87.9\u202f%');
  expect(row.textContent).toContain('+13.8');
  expect(row.textContent).toContain('0.60');
  expect(row.textContent).toContain('0.126');
  expect(document.body.textContent).not.toContain('.061');
  await userEvent.click(screen.getByRole('checkbox', { name: /For the analyst/ }));
  expect(screen.getByRole('table', { name: 'Errors and paired t of each class' }).textContent).toContain(
    '.061',
  );
});

test('a page for one class has its lines and no test', async () => {
  await shown([...worked('Otter'), ...worked('Heron')], '/afterwards/change/Otter');
  expect(screen.getByRole('img', { name: /^Otter: percent on-task of each child/ })).toBeTruthy();
  expect(screen.queryByRole('checkbox', { name: /For the analyst/ })).toBeNull();
  expect(document.body.textContent).not.toContain('.061');
});

test('two classes under one condition are taken together, without a cause', async () => {
  expect(await shown([...worked('Otter'), ...worked('Heron')])).toBe(
    'The classes were on-task 14 points more after than before: about 2 minutes in 15.',
  );
  expect(
    screen.getByText(/There is no comparison, so the clock, the task or the break may have done it/),
  ).toBeTruthy();
});

test('one class in each condition: class and break cannot be told apart', async () => {
  const heading = await shown([...worked('Otter', 'break'), ...worked('Heron', 'control')]);
  expect(heading).toBe('On-task changed as much with “break” as with “control”.');
  expect(screen.getByText(/the class and what it was given cannot be told apart/)).toBeTruthy();
});

test('one phase only is no change', async () => {
  expect(
    await shown(looksOf({ session: 'a', observer: 'Quill', class: 'Otter', phase: 'before' }, { C: '1101' })),
  ).toBe('Change needs two phases, and the visits have only one so far.');
});

test('one child only: the change is told, what cannot be known says why', async () => {
  const of = (phase: string, looks: string): Row[] =>
    looksOf({ session: phase, observer: 'Quill', class: 'Otter', phase }, { C: looks });
  await shown([...of('before', '1100'), ...of('after', '1110')]);
  expect(screen.getByText(/How sure this is cannot be told from so few/)).toBeTruthy();
  expect(screen.getByText(/only one child was scored in both phases\.$/)).toBeTruthy();
  expect(document.body.textContent).not.toMatch(/NaN|null/);
});
