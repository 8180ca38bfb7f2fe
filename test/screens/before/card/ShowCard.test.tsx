// @vitest-environment happy-dom
import { cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, it } from 'vitest';
import { HandVisit } from '../../../../src/screens/before/HandVisit.tsx';
import type { Device } from '../../../../src/screens/services.ts';
import { addParts, readPairingCard } from '../../../../src/tasks/readCard.ts';
import { preparedVisit } from '../../../exchange/cardVisits.ts';
import { fakeDevice, fakeServices, renderScreen } from '../../support/renderScreen.tsx';
import { must } from '../../support/studyOf.ts';
import { handWound } from './handWound.ts';

afterEach(cleanup);

const usual = await preparedVisit({ children: 30, plan: { kind: 'pairs', columns: 5, rows: 3 } });

async function showing(device: Partial<Device> = {}, plan = usual) {
  const timer = handWound();
  const services = fakeServices({ device: fakeDevice({ wakeIn: timer.wakeIn, ...device }) });
  renderScreen(<HandVisit plan={plan} />, services, '/before/ready');
  await userEvent.click(await screen.findByRole('button', { name: 'Show the pairing card' }));
  await screen.findByRole('img');
  return { timer, services };
}

const shown = () => screen.getByRole('img').getAttribute('aria-label');

it('shows the pictures in turn, each for a second and a half, and begins again after the last', async () => {
  const { timer } = await showing();
  const seen = [shown()];
  const drawn = new Set([screen.getByRole('img').innerHTML]);
  for (let i = 0; i < 3; i++) {
    expect(timer.waiting()).toEqual([1500]);
    await timer.next();
    seen.push(shown());
    drawn.add(screen.getByRole('img').innerHTML);
  }
  expect(seen).toEqual(['Picture 1 of 3', 'Picture 2 of 3', 'Picture 3 of 3', 'Picture 1 of 3']);
  expect(drawn.size).toBe(3);
});

it('stays at one when told to, is stepped by hand, and goes on', async () => {
  const { timer } = await showing();
  await userEvent.click(screen.getByRole('button', { name: 'Back' }));
  expect([shown(), timer.waiting()]).toEqual(['Picture 3 of 3', []]);
  await userEvent.click(screen.getByRole('button', { name: 'Next' }));
  expect(shown()).toBe('Picture 1 of 3');
  await userEvent.click(screen.getByRole('button', { name: 'Show them in turn' }));
  expect(timer.waiting()).toEqual([1500]);
  await userEvent.click(screen.getByRole('button', { name: 'Stay at this one' }));
  expect([shown(), timer.waiting()]).toEqual(['Picture 1 of 3', []]);
});

it('says what is in it, and that it was shown', async () => {
  await showing();
  const what = screen.getByText(/^In it: Class Otter, /).textContent;
  for (const { pseudonym } of usual.children) expect(what).toContain(pseudonym);
  expect(what).toContain('with the seats, “Next child, every 15 seconds”, start at 10:40.');
  await userEvent.click(screen.getByRole('button', { name: 'Done' }));
  expect(await screen.findByText('The pairing card was shown.')).toBeTruthy();
  expect(screen.queryByRole('img')).toBeNull();
});

it('copies a text that holds the whole visit', async () => {
  const copied: string[] = [];
  await showing({
    copyText: async (text) => {
      copied.push(text);
      return true;
    },
  });
  expect(screen.getByText(/^2,\d\d\d characters, made to be pasted/)).toBeTruthy();
  await userEvent.click(screen.getByRole('button', { name: 'Copy as text' }));
  expect(await screen.findByText(/^Copied\./)).toBeTruthy();
  expect(must(await readPairingCard(must(addParts(null, copied[0] ?? ''))))).toEqual(usual);
});

it('shows the text where a page may not copy', async () => {
  await showing({ copyText: async () => false });
  await userEvent.click(screen.getByRole('button', { name: 'Copy as text' }));
  expect((await screen.findByRole('alert')).textContent).toContain('copy it by hand');
  const shownText = screen.getByRole('figure', { name: 'The card as text' }).textContent;
  expect(must(await readPairingCard(must(addParts(null, shownText))))).toEqual(usual);
});

it('lets the protocol’s version stand from then on', async () => {
  const { services } = await showing();
  const { id, version } = usual.schedule.protocol;
  await waitFor(async () =>
    expect(must(await services.store.settings()).frozenProtocols).toEqual([`${id} ${version}`]),
  );
});
