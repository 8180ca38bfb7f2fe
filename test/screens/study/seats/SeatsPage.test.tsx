// @vitest-environment happy-dom
import { cleanup, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { SeatsPage } from '../../../../src/screens/study/seats/SeatsPage.tsx';
import { setSeatingPlan } from '../../../../src/tasks/index.ts';
import { fakeServices, renderScreen } from '../../support/renderScreen.tsx';
import { studyWithClass } from '../../support/study.ts';
import { must } from '../../support/studyOf.ts';

afterEach(cleanup);

/** The page of a class of eight, with two tables of two in one row unless the room is still empty. */
async function opened({ empty = false } = {}) {
  const services = fakeServices();
  const { classroom } = await studyWithClass(services);
  if (!empty) must(await setSeatingPlan(services.deps, classroom.id, { kind: 'pairs', columns: 2, rows: 1 }));
  renderScreen(<SeatsPage id={classroom.id} />, services);
  await screen.findByRole('heading', { name: 'Where does everybody sit in Otter?' });
  const plan = async () => must(await services.store.classroom(classroom.id))?.plan ?? null;
  const nameOf = (child: string | null) =>
    classroom.children.find((one) => one.id === child)?.pseudonym ?? null;
  /** Who sits where: row by row from the front, null for a free seat. */
  const seated = async () =>
    [...((await plan())?.seats ?? [])]
      .sort((a, b) => a.row - b.row || a.column - b.column)
      .map((seat) => nameOf(seat.child));
  return { plan, seated };
}

const child = (name: string) => screen.getByRole('button', { name });
const freeSeat = (place: number) => screen.getByRole('button', { name: `Free seat, row 1, place ${place}` });
const undo = () => screen.getAllByRole('button', { name: 'Undo' })[0] as HTMLElement;

describe('Seats', () => {
  it('put up a room in one tap, with a seat for every child, and take it back', async () => {
    const { plan } = await opened({ empty: true });
    // Eight children at tables of two, three side by side: two rows.
    await userEvent.click(screen.getByRole('button', { name: 'Put up 12 seats' }));
    await screen.findByText('Tap a child, then a seat. Or a seat, then a child.');
    expect((await plan())?.seats).toHaveLength(12);
    await userEvent.click(undo());
    await waitFor(async () => expect(await plan()).toBeNull());
  });

  it('seat children by two taps in either order, and the list holds those who still stand', async () => {
    const { seated } = await opened();
    await userEvent.click(child('Otter-03'));
    expect(screen.getByText('Otter-03: tap a seat.')).toBeTruthy();
    await userEvent.click(freeSeat(1));
    await screen.findByRole('button', { name: 'Otter-03, row 1, place 1' });
    await userEvent.click(freeSeat(5));
    await userEvent.click(child('Otter-01'));
    await waitFor(async () => expect(await seated()).toEqual(['Otter-03', null, null, 'Otter-01']));
    const standing = screen.getByRole('region', { name: 'Children without a seat' });
    await waitFor(() =>
      expect(
        within(standing)
          .getAllByRole('button')
          .map((one) => one.textContent),
      ).toEqual(['Otter-02', 'Otter-04', 'Otter-05', 'Otter-06', 'Otter-07', 'Otter-08']),
    );
    // The button under the keyboard is gone; the next tabulator is still in the list.
    expect(document.activeElement).toBe(standing);
  });

  it('take a child off by a second tap, move it by another seat, and let two change places', async () => {
    const { seated } = await opened();
    for (const [name, place] of [
      ['Otter-01', 1],
      ['Otter-02', 2],
    ] as const) {
      await userEvent.click(child(name));
      await userEvent.click(freeSeat(place));
      await screen.findByRole('button', { name: `${name}, row 1, place ${place}` });
    }
    await userEvent.click(screen.getByRole('button', { name: /^Otter-01, row/ }));
    await userEvent.click(screen.getByRole('button', { name: /^Otter-02, row/ }));
    await waitFor(async () => expect(await seated()).toEqual(['Otter-02', 'Otter-01', null, null]));
    await userEvent.click(await screen.findByRole('button', { name: 'Otter-01, row 1, place 2' }));
    await userEvent.click(freeSeat(5));
    await waitFor(async () => expect(await seated()).toEqual(['Otter-02', null, null, 'Otter-01']));
    const seat = await screen.findByRole('button', { name: 'Otter-01, row 1, place 5' });
    await userEvent.click(seat);
    await userEvent.click(seat);
    await waitFor(async () => expect(await seated()).toEqual(['Otter-02', null, null, null]));
  });

  it('go by the keyboard alone', async () => {
    const { seated } = await opened();
    child('Otter-02').focus();
    await userEvent.keyboard('{Enter}');
    freeSeat(2).focus();
    await userEvent.keyboard(' ');
    await waitFor(async () => expect(await seated()).toEqual([null, 'Otter-02', null, null]));
  });

  it('undo step by step, the latest first', async () => {
    const { seated } = await opened();
    expect(undo().getAttribute('aria-disabled')).toBe('true');
    await userEvent.click(child('Otter-01'));
    await userEvent.click(freeSeat(1));
    await screen.findByRole('button', { name: 'Otter-01, row 1, place 1' });
    await userEvent.click(child('Otter-02'));
    await userEvent.click(freeSeat(2));
    await waitFor(async () => expect(await seated()).toEqual(['Otter-01', 'Otter-02', null, null]));
    await userEvent.click(undo());
    await waitFor(async () => expect(await seated()).toEqual(['Otter-01', null, null, null]));
    await userEvent.click(undo());
    await waitFor(async () => expect(await seated()).toEqual([null, null, null, null]));
    await waitFor(() => expect(undo().getAttribute('aria-disabled')).toBe('true'));
  });

  it('take away and put up seats as fast as they are tapped, and a new one joins the table beside it', async () => {
    const { plan } = await opened();
    await userEvent.click(screen.getByRole('radio', { name: 'Put up and take away seats' }));
    // Row and place count the rim of free places in which a room can grow.
    const [first, second] = screen.getAllByRole('button', { name: /^Free seat/ });
    first?.click();
    second?.click();
    await waitFor(async () => expect((await plan())?.seats).toHaveLength(2));
    // The left table and its aisle are gone, so the room is two places wide again.
    expect((await plan())?.columns).toBe(2);
    const [left] = await screen.findAllByRole('button', { name: 'Put a seat in row 2, place 1' });
    await waitFor(() => expect(screen.getAllByRole('button', { name: /^Free seat/ })).toHaveLength(2));
    await userEvent.click(left as HTMLElement);
    await waitFor(async () => expect((await plan())?.seats).toHaveLength(3));
    const now = await plan();
    expect(now?.columns).toBe(3);
    expect(new Set(now?.seats.map((seat) => seat.table)).size).toBe(1);
    expect(now?.seats.map((seat) => seat.column).sort()).toEqual([0, 1, 2]);
  });

  it('turn to where the observer sits: the seat at the far left is near, on the right, from the front', async () => {
    const { plan } = await opened();
    await userEvent.click(child('Otter-01'));
    await userEvent.click(freeSeat(1));
    await screen.findByRole('button', { name: 'Otter-01, row 1, place 1' });
    await userEvent.click(screen.getByRole('radio', { name: 'at the front' }));
    // Four seats and an aisle: the first place from the left is the fifth from the other side.
    await screen.findByRole('button', { name: 'Otter-01, row 1, place 5' });
    expect((await plan())?.observerSide).toBe('front');
  });
});
