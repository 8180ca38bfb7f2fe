// @vitest-environment happy-dom
import { cleanup, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import type { Protocol } from '../../../src/model/protocol.ts';
import { Prepare } from '../../../src/screens/before/Prepare.tsx';
import { Ready } from '../../../src/screens/before/Ready.tsx';
import { type ProtocolDraft, saveProtocol, switchMethod, undoDraw } from '../../../src/tasks/index.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { studyWithClass } from '../support/study.ts';
import { must } from '../support/studyOf.ts';

afterEach(cleanup);

const draftOf = ({ version: _v, removed: _r, revision: _n, ...draft }: Protocol): ProtocolDraft => ({
  ...draft,
  id: null,
  name: 'Today’s',
});

/** The page with a class of eight and a protocol of the test's own chosen. */
async function choosing(changes: (draft: ProtocolDraft) => ProtocolDraft, drawn = true) {
  const services = fakeServices();
  const { classroom, protocol } = await studyWithClass(services);
  if (!drawn) must(await undoDraw(services.deps, classroom.id));
  must(await saveProtocol(services.deps, changes(draftOf(protocol))));
  const view = renderScreen(<Prepare />, services);
  await userEvent.click(await screen.findByRole('radio', { name: /^Today’s/ }));
  const prepared = async () => must(await services.store.settings()).prepared;
  return { services, classroom, view, prepared };
}

const prepare = () => screen.getByRole<HTMLButtonElement>('button', { name: 'Prepare the visit' });
const rows = () =>
  screen.getAllByRole('row', { hidden: true }).map((row) => row.firstElementChild?.textContent);

describe('the day of a visit', () => {
  it('counts the whole class without a draw, but for those who are away', async () => {
    const { view, prepared } = await choosing((draft) => switchMethod(draft, 'headcount'), false);
    expect(screen.getAllByRole('checkbox')).toHaveLength(8);
    await userEvent.click(screen.getByRole('checkbox', { name: 'Otter-03' }));
    expect(
      screen.getByText('15 counts of the class in 15 minutes in each phase, 7 children present.'),
    ).toBeTruthy();
    await userEvent.click(prepare());
    await waitFor(() => expect(view.visited.at(-1)).toBe('/before/ready'));
    expect((await prepared())?.children).toHaveLength(7);
  });

  it('shows the target that chance gives, lets another be chosen, and pictures the order that is frozen', async () => {
    const { view, prepared, services } = await choosing((draft) => ({
      ...draft,
      rotation: { kind: 'target', peerEvery: 4 },
      order: 'random each round',
    }));
    const select = screen.getByRole('combobox', { name: 'Target child' });
    const byChance = /as chance has it: (Otter-0\d)/.exec(select.textContent ?? '')?.[1];
    expect(rows()[1]).toBe(`${byChance}, target`);
    const other = screen
      .getAllByRole<HTMLOptionElement>('option')
      .find(({ textContent, value }) => value !== '' && textContent !== byChance);
    await userEvent.selectOptions(select, other?.value ?? '');
    expect(rows()[1]).toBe(`${other?.textContent}, target`);
    const pictured = rows();
    await userEvent.click(prepare());
    await waitFor(() => expect(view.visited.at(-1)).toBe('/before/ready'));
    const plan = await prepared();
    expect(plan?.children[0]?.pseudonym).toBe(other?.textContent);
    expect(plan?.schedule.turns).toHaveLength(2);
    view.unmount();
    renderScreen(<Ready />, services, '/before/ready');
    await screen.findByRole('img', { name: /^The schedule/ });
    expect(rows()).toEqual(pictured);
  });

  it('needs no draw for a duration once the child is chosen', async () => {
    const { view, prepared } = await choosing((draft) => switchMethod(draft, 'duration'), false);
    expect(prepare().getAttribute('aria-disabled')).toBe('true');
    expect(screen.getByText('First choose the child to watch, or draw one.')).toBeTruthy();
    expect(screen.getByRole('button', { name: /^Draw 1 at random/ })).toBeTruthy();
    await userEvent.selectOptions(screen.getByRole('combobox', { name: 'The child to watch' }), 'Otter-05');
    expect(screen.getByText('One child, watched for all of 15 minutes in each phase.')).toBeTruthy();
    await userEvent.click(prepare());
    await waitFor(() => expect(view.visited.at(-1)).toBe('/before/ready'));
    expect((await prepared())?.children.map(({ pseudonym }) => pseudonym)).toEqual(['Otter-05']);
  });

  it('counts looks as the schedule does: a reserve for an absent child changes nothing, one child fewer does', async () => {
    const { classroom } = await choosing((draft) => ({ ...draft, reserves: 0 }));
    const [first, second, third] = classroom.draw?.chosen ?? [];
    const nameOf = (id?: string) => classroom.children.find((child) => child.id === id)?.pseudonym ?? '';
    expect(screen.getByText('10 looks a child in 15 minutes in each phase, 6 children.')).toBeTruthy();
    for (const id of [first, second]) {
      await userEvent.click(screen.getByRole('checkbox', { name: nameOf(id) }));
    }
    expect(screen.getByText('10 looks a child in 15 minutes in each phase, 6 children.')).toBeTruthy();
    await userEvent.click(screen.getByRole('checkbox', { name: nameOf(third) }));
    expect(screen.getByText('12 looks a child in 15 minutes in each phase, 5 children.')).toBeTruthy();
  });
});
