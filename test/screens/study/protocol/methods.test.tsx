// @vitest-environment happy-dom
import { cleanup, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { StudyPages } from '../../../../src/screens/study/StudyPages.tsx';
import { fakeServices, renderScreen } from '../../support/renderScreen.tsx';
import { studyWithClass } from '../../support/study.ts';
import { must } from '../../support/studyOf.ts';

afterEach(cleanup);

async function newProtocol() {
  const services = fakeServices();
  const { study } = await studyWithClass(services);
  renderScreen(<StudyPages />, services, '/study/protocols/new');
  await screen.findByText('How to watch');
  const kept = async (name: string) =>
    must(await services.store.protocols(study.id)).find((one) => one.name === name);
  return { services, kept };
}

const choose = (name: RegExp) => userEvent.click(screen.getByRole('radio', { name }));
async function typeInto(label: string, text: string) {
  const field = screen.getByLabelText(label);
  await userEvent.clear(field);
  await userEvent.type(field, text);
}
const keep = () => userEvent.click(screen.getByRole('button', { name: 'Keep this protocol' }));
const table = () =>
  screen
    .getAllByRole('row', { hidden: true })
    .map((row) => [...row.children].map((cell) => cell.textContent));

/** What stands under a field as help. */
const hintOf = (label: string) =>
  document.getElementById(screen.getByLabelText(label).getAttribute('aria-describedby') ?? '')?.textContent;

describe('the words of a protocol are explained where they are chosen:', () => {
  it('watching and recording, block and sweep', async () => {
    await newProtocol();
    await choose(/^all children, one after the other.* A sweep: your eyes go once through the room/);
    await choose(/^several intervals in a row.* A block of looks at one child/);
    expect(hintOf('Intervals in a row')).toMatch(/^The length of a block\./);
    await choose(/^partial interval/);
    expect(hintOf('Seconds of watching')).toMatch(/what happens in this time counts/);
    expect(hintOf('Seconds for recording')).toMatch(/what happens now does not count/);
  });

  it('a round, which is another thing in each rotation', async () => {
    await newProtocol();
    await choose(/^by rounds/);
    const round = () => hintOf('Rounds a part')?.split('.')[0];
    expect(round()).toBe('A round is over when each child has had its turn once');
    await choose(/^several intervals in a row/);
    expect(round()).toBe('A round is over when each child has had its block once');
    await choose(/^all children, one after the other/);
    expect(round()).toBe('A round is one sweep');
    await choose(/^a target child/);
    expect(round()).toBe('A round is over when each peer has had its look once');
    await choose(/^one child throughout/);
    expect(round()).toBe('A round is one look');
    await choose(/^headcount/);
    expect(round()).toBe('A round is one count');
  });

  it('a code, its key, and the way to other keys', async () => {
    await newProtocol();
    expect(screen.getByText(/^A code is what one touch says of a child/)).toBeTruthy();
    expect(screen.getByText(/^On a keyboard, 1 is the first code/)).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Observers and their keys' }).getAttribute('href')).toBe(
      '#/study/observers',
    );
  });

  it('six codes are the most and two the fewest, said beside the button', async () => {
    await newProtocol();
    const away = screen.getByRole('button', { name: 'Take off-task away' });
    expect(document.getElementById(away.getAttribute('aria-describedby') ?? '')?.textContent).toBe(
      'two codes are the fewest',
    );
    for (let k = 0; k < 4; k++) await userEvent.click(screen.getByRole('button', { name: 'Add a code' }));
    expect(screen.getByText('six codes are the most')).toBeTruthy();
    await userEvent.click(screen.getByRole('button', { name: 'Add a code' }));
    expect(screen.getAllByLabelText(/^Label of code/)).toHaveLength(6);
  });
});

describe('the methods of a protocol', () => {
  it('headcount: a count a minute, and neither draw nor turns nor heads-up to ask for', async () => {
    const { kept } = await newProtocol();
    await choose(/^headcount/);
    expect(screen.getByText('15 counts of everybody present in a part of 15 minutes.')).toBeTruthy();
    for (const gone of ['Children to draw', 'Reserves']) expect(screen.queryByLabelText(gone)).toBeNull();
    expect(screen.queryByRole('group', { name: 'Whose turn' })).toBeNull();
    expect(screen.queryByRole('group', { name: /Heads-up/ })).toBeNull();
    await choose(/^when the interval starts/);
    await typeInto('Name of the protocol', 'Counting');
    await keep();
    await waitFor(async () =>
      expect(await kept('Counting')).toMatchObject({
        method: 'headcount',
        intervalMs: 60_000,
        lookAt: 'start',
      }),
    );
  });

  it('duration: one child by minutes, and no interval to ask for', async () => {
    const { kept } = await newProtocol();
    await choose(/^by rounds/);
    await choose(/^duration/);
    expect(screen.getByText('One child, watched for all 15 minutes of a part.')).toBeTruthy();
    expect(screen.queryByLabelText('Interval, in seconds')).toBeNull();
    expect(screen.queryByLabelText('Grace, in seconds')).toBeNull();
    expect(screen.queryByRole('radio', { name: /^by rounds/ })).toBeNull();
    await typeInto('Name of the protocol', 'All the time');
    await keep();
    await waitFor(async () =>
      expect(await kept('All the time')).toMatchObject({
        method: 'duration',
        childrenToDraw: 1,
        partLength: { kind: 'minutes', minutes: 15 },
      }),
    );
  });

  it('whole interval: watching and recording make the interval, recording may be none', async () => {
    const { kept } = await newProtocol();
    await choose(/^whole interval/);
    await typeInto('Seconds of watching', '20');
    await typeInto('Seconds for recording', '2');
    expect(screen.getByText('Either 0 or a whole number from 3 to 600 is needed.')).toBeTruthy();
    await typeInto('Seconds for recording', '0');
    await typeInto('Name of the protocol', 'Whole');
    await keep();
    await waitFor(async () =>
      expect(await kept('Whole')).toMatchObject({ method: 'whole', observeMs: 20_000, intervalMs: 20_000 }),
    );
  });

  it('keeps order, pause, stand-in and heads-up', async () => {
    const { kept } = await newProtocol();
    await choose(/anew for each round/);
    await choose(/^repeated/);
    await userEvent.click(screen.getByRole('checkbox', { name: /a reserve steps in/ }));
    await choose(/^the seat is spoken/);
    await typeInto('Seconds ahead', '4');
    await typeInto('Name of the protocol', 'All of it');
    await keep();
    await waitFor(async () =>
      expect(await kept('All of it')).toMatchObject({
        order: 'random each round',
        afterPause: 'repeat',
        reservesStepIn: true,
        cues: { headsUp: { says: 'seat', aheadMs: 4000 } },
      }),
    );
  });

  it('says at once that a sweep does not fit, and keeps it only once it does', async () => {
    const { kept } = await newProtocol();
    await choose(/^all children, one after the other/);
    expect(screen.getByText(/^A sweep of 6 children takes 18 s, and the interval has 15 s\./)).toBeTruthy();
    await typeInto('Name of the protocol', 'Sweep');
    await keep();
    expect(await screen.findByRole('alert')).toBeTruthy();
    expect(await kept('Sweep')).toBeUndefined();
    await typeInto('Interval, in seconds', '60');
    await keep();
    await waitFor(async () => expect(await kept('Sweep')).toMatchObject({ rotation: { kind: 'sweep' } }));
  });

  it('pictures one part as it is changed, and says the same in a table', async () => {
    await newProtocol();
    expect(screen.getByRole('img', { name: /one row for each of 6 children/ })).toBeTruthy();
    expect(table()).toContainEqual(['child 1', '10', '0:15', '13:45', '1:30']);
    await choose(/^a target child/);
    expect(table()[1]).toEqual(['child 1, target', '45', '0:15', '14:45', '0:30']);
    const means = screen.getByRole('status');
    expect(
      within(means).getByText(/^45 looks at the target child and at least 3 at each of 5 peers/),
    ).toBeTruthy();
    await choose(/^headcount/);
    expect(table()[1]).toEqual(['everybody', '15', '1:00', '15:00', '1:00']);
  });
});
