// @vitest-environment happy-dom
import { act, cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test } from 'vitest';
import { problem } from '../../../src/kernel/result.ts';
import { Afterwards } from '../../../src/screens/afterwards/Afterwards.tsx';
import type { Ask, AskOptions } from '../../../src/worker/questions.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { emptyStudy } from '../support/studyOf.ts';

afterEach(cleanup);

/** An answer that never comes; the test tells the progress. */
function slowAsk() {
  const asked: AskOptions[] = [];
  const ask: Ask = (_question, options = {}) => {
    asked.push(options);
    return new Promise(() => undefined);
  };
  return { ask, asked };
}

test('long work shows how far it is, can be stopped and taken up again', async () => {
  const { ask, asked } = slowAsk();
  const services = fakeServices({ ask });
  await emptyStudy(services);
  renderScreen(<Afterwards />, services, '/afterwards/agreement');
  await waitFor(() => expect(asked).toHaveLength(1));
  act(() => asked.at(-1)?.progress?.(0.4));
  expect(screen.getByText('Working it out, 40 % …')).toBeTruthy();
  await userEvent.click(screen.getByRole('button', { name: 'Stop' }));
  expect(asked.at(-1)?.signal?.aborted).toBe(true);
  expect(await screen.findByRole('heading', { name: 'Stopped.' })).toBeTruthy();
  await userEvent.click(screen.getByRole('button', { name: 'Work it out again' }));
  await waitFor(() => expect(asked).toHaveLength(2));
  expect(asked.at(-1)?.signal?.aborted).toBe(false);
});

test('a problem is one sentence', async () => {
  const services = fakeServices({ ask: async () => problem('task.noStudy', { id: 'x' }) });
  await emptyStudy(services);
  renderScreen(<Afterwards />, services, '/afterwards/agreement');
  expect(await screen.findByText('This study is not on this tablet.')).toBeTruthy();
});
