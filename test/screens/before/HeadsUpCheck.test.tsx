// @vitest-environment happy-dom
import { cleanup, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, it } from 'vitest';
import type { HeadsUp } from '../../../src/model/protocol.ts';
import { HeadsUpCheck } from '../../../src/screens/before/HeadsUpCheck.tsx';
import type { Device } from '../../../src/screens/services.ts';
import { shortVisit } from '../../browser/support/shortVisit.ts';
import { protocolOf } from '../../support/session.ts';
import { fakeDevice, fakeServices, renderScreen } from '../support/renderScreen.tsx';

afterEach(cleanup);

function show(headsUp: HeadsUp | null, device: Partial<Device> = {}) {
  const cues = { ...protocolOf().cues, ...(headsUp === null ? {} : { headsUp }) };
  const visit = shortVisit({ key: 'heads up', protocol: { cues } });
  return renderScreen(<HeadsUpCheck visit={visit} />, fakeServices({ device: fakeDevice(device) }));
}

it('is not there where the protocol wants no words', () => {
  expect(show(null).container.textContent).toBe('');
});

it('says that a voice speaks, in both ears, and lets it be heard with the first child', async () => {
  const tried: string[] = [];
  show(
    { says: 'child', aheadMs: 2000 },
    {
      hasVoice: () => true,
      tryHeadsUp: async (words) => {
        tried.push(words);
        return 'voice';
      },
    },
  );
  screen.getByText(/“Otter 1”, in both ears, also where the tones go to one/);
  await userEvent.click(screen.getByRole('button', { name: 'Hear the voice' }));
  expect(tried).toEqual(['Otter 1']);
});

it('says a seat as it is counted', () => {
  show({ says: 'seat', aheadMs: 2000 }, { hasVoice: () => true });
  screen.getByText(/“row 1, first from the left”.*The row nearest to you is the first/);
});

it('says that tones take its place where no voice is on the tablet, and when there was no sound at all', async () => {
  show({ says: 'child', aheadMs: 2000 }, { tryHeadsUp: async () => 'nothing' });
  screen.getByText(/^No voice is on this tablet itself/);
  await userEvent.click(screen.getByRole('button', { name: 'Hear the two tones' }));
  await screen.findByText(/The tablet gave no sound\./);
});
