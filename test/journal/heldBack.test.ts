import { describe, expect, it } from 'vitest';
import { heldBack } from '../../src/journal/heldBack.ts';

type Listed = Parameters<typeof heldBack>[0][number];
const session = (id: string, observer: string, more: Partial<Listed> = {}): Listed => ({
  id,
  visit: 'visit-1',
  observer: { id: observer },
  here: false,
  ended: 'complete',
  ...more,
});
const own = (ended: Listed['ended'], more: Partial<Listed> = {}) =>
  session('own', 'quill', { here: true, ended, ...more });

describe('records that stay closed', () => {
  it('the other’s of the same visit, until one’s own has ended, in whatever way', () => {
    const other = session('other', 'marsh');
    expect([...heldBack([own(null), other])]).toEqual(['other']);
    expect(heldBack([own('complete'), other]).size).toBe(0);
    expect(heldBack([own('early'), other]).size).toBe(0);
  });

  it('not one’s own, nor those of other visits', () => {
    const sessions = [
      own(null),
      session('mine before', 'quill'),
      session('elsewhere', 'marsh', { visit: 'visit-2' }),
    ];
    expect(heldBack(sessions).size).toBe(0);
  });

  it('not because a record that came in by a file never ended', () => {
    expect(heldBack([session('lost', 'quill', { ended: null }), session('other', 'marsh')]).size).toBe(0);
  });

  it('also where a hand put the one or the other to the visit', () => {
    const other = session('other', 'marsh', { visit: 'visit-2' });
    const put = (id: string, visit: string) => [...heldBack([own(null), other], [{ session: id, visit }])];
    expect(put('other', 'visit-1')).toEqual(['other']);
    expect(put('own', 'visit-2')).toEqual(['other']);
    expect(put('other', 'visit-3')).toEqual([]);
  });

  it('on a tablet that two observers shared, the first one’s while the second one records', () => {
    const first = session('first', 'marsh', { here: true });
    expect([...heldBack([own(null), first])]).toEqual(['first']);
    const both = [own(null), session('first', 'marsh', { here: true, ended: null })];
    expect(new Set(heldBack(both))).toEqual(new Set(['own', 'first']));
  });
});
