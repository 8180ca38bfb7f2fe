// @vitest-environment happy-dom
import { cleanup, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test } from 'vitest';
import { Files } from '../../../src/screens/files/Files.tsx';
import { csvOf, looksOf } from '../../analysis/sessionsFrom.ts';
import { fakeDevice, fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { emptyStudy, keepRecorded, must } from '../support/studyOf.ts';

afterEach(cleanup);

const rows = looksOf({ session: 'a', observer: 'Quill', class: 'Otter', phase: 'before' }, { C: '1101' });
const file = (name: string, text: string): File => new File([text], name, { type: 'text/csv' });
const inputs = (): HTMLInputElement[] => [...document.querySelectorAll<HTMLInputElement>('input[type=file]')];
const bring = (...files: File[]) =>
  userEvent.upload(inputs()[0] as HTMLInputElement, files, { applyAccept: false });

test('what a file would bring is shown before it is kept', async () => {
  const services = fakeServices();
  renderScreen(<Files />, services, '/study/files');
  await screen.findByRole('heading', { level: 1 });
  await bring(file('otter.csv', csvOf(rows)));
  expect(await screen.findByText(/1 new session/)).toBeTruthy();
  expect(must(await services.store.studies())).toEqual([]);
  await userEvent.click(screen.getByRole('button', { name: 'Take in the file' }));
  expect(await screen.findByText('Taken in.')).toBeTruthy();
  expect(must(await services.store.studies())).toHaveLength(1);
});

test('a bad file gets one sentence and contributes nothing; the good one goes on', async () => {
  const services = fakeServices();
  renderScreen(<Files />, services, '/study/files');
  await screen.findByRole('heading', { level: 1 });
  await bring(file('page.csv', '<!doctype html><html></html>'), file('otter.csv', csvOf(rows)));
  expect(await screen.findByText('page.csv')).toBeTruthy();
  expect(
    screen.getByText('Line 1: This is a web page; expected a study file, a visit file or an interval table.'),
  ).toBeTruthy();
  expect(screen.getByRole('button', { name: 'Take in the file' })).toBeTruthy();
});

test('only bad files cannot be taken in', async () => {
  renderScreen(<Files />, fakeServices(), '/study/files');
  await screen.findByRole('heading', { level: 1 });
  await bring(file('page.csv', '<!doctype html><html></html>'));
  await screen.findByText(/cannot be taken in/);
  expect(screen.queryByRole('button', { name: /^Take in/ })).toBeNull();
});

test('codes that do not say what they are, are asked for', async () => {
  const services = fakeServices();
  renderScreen(<Files />, services, '/study/files');
  await screen.findByRole('heading', { level: 1 });
  const codes = rows.map((row, k) => ({ ...row, code: k % 2 === 0 ? 'engaged' : 'elsewhere' }));
  await bring(file('otter.csv', csvOf(codes)));
  const again = await screen.findByRole('button', { name: 'Read the table again' });
  expect(again).toHaveProperty('disabled', true);
  const [engaged, elsewhere] = ['engaged', 'elsewhere'].map((name) => screen.getByRole('group', { name }));
  await userEvent.click(engaged?.querySelectorAll('input')[0] as HTMLInputElement);
  await userEvent.click(elsewhere?.querySelectorAll('input')[1] as HTMLInputElement);
  await userEvent.click(again);
  await userEvent.click(await screen.findByRole('button', { name: 'Take in the file' }));
  await screen.findByText('Taken in.');
  const [study] = must(await services.store.studies());
  const [session] = must(await services.store.listSessions(study?.id ?? ''));
  const answer = must(await services.ask({ kind: 'session', session: session?.id ?? '' }));
  expect(answer.details.phases[0]?.row.percentOnTask).toBe(50);
});

test('the interval table leaves the tablet and counts for nothing handed over', async () => {
  const given: string[] = [];
  const services = fakeServices({
    device: fakeDevice({
      handOver: async ({ name }) => {
        given.push(name);
        return 'saved';
      },
    }),
  });
  await emptyStudy(services);
  await keepRecorded(services, { id: 's1' });
  renderScreen(<Files />, services, '/study/files');
  expect(await screen.findByRole('heading', { name: '1 record is only on this tablet.' })).toBeTruthy();
  await userEvent.click(screen.getByRole('button', { name: 'Make the interval table' }));
  await userEvent.click(await screen.findByRole('button', { name: 'Share or save it' }));
  expect(await screen.findByText('The file was saved to the downloads.')).toBeTruthy();
  expect(given[0]).toMatch(/\.csv$/);
  expect(screen.getByRole('heading', { name: '1 record is only on this tablet.' })).toBeTruthy();
  expect(screen.getByText('The study file has never left this tablet.')).toBeTruthy();
});

test('the browser that wants another tap gets it', async () => {
  const answers: ('again' | 'shared')[] = ['again', 'shared'];
  const services = fakeServices({
    device: fakeDevice({ handOver: async () => answers.shift() ?? 'shared' }),
  });
  await emptyStudy(services);
  await keepRecorded(services, { id: 's1' });
  renderScreen(<Files />, services, '/study/files');
  await userEvent.click(await screen.findByRole('button', { name: 'Make the study file' }));
  await userEvent.click(await screen.findByRole('button', { name: 'Share or save it' }));
  expect(await screen.findByText('The browser asks for one more tap.')).toBeTruthy();
  await userEvent.click(screen.getByRole('button', { name: 'Share or save it' }));
  expect(await screen.findByText('The file was shared.')).toBeTruthy();
  expect(await screen.findByText(/last left this tablet on Tuesday 3 November at 10:41/)).toBeTruthy();
});
