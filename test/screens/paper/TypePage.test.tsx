// @vitest-environment happy-dom
import { cleanup, screen, waitFor, within } from '@testing-library/react';
import userEvent, { type UserEvent } from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { sessionDetails } from '../../../src/analysis/index.ts';
import type { KnownEntry } from '../../../src/journal/entry.ts';
import { isKnown } from '../../../src/journal/known.ts';
import { readOut } from '../../../src/journal/readOut.ts';
import { fold } from '../../../src/journal/step.ts';
import { problem } from '../../../src/kernel/result.ts';
import type { Protocol } from '../../../src/model/protocol.ts';
import type { VisitPlan } from '../../../src/model/visitPlan.ts';
import { sheetLabel } from '../../../src/schedule/sheetLabel.ts';
import { TypePage } from '../../../src/screens/paper/TypePage.tsx';
import type { Services } from '../../../src/screens/services.ts';
import { addObserver, prepareVisit, saveObserver } from '../../../src/tasks/index.ts';
import { fakeServices, renderScreen } from '../support/renderScreen.tsx';
import { studyWithClass } from '../support/study.ts';
import { must } from '../support/studyOf.ts';

afterEach(cleanup);

interface Bench {
  readonly services: Services;
  readonly plan: VisitPlan;
  readonly user: UserEvent;
  readonly show: () => ReturnType<typeof renderScreen>;
}

/** A prepared visit of two children, two rounds in each part, an observer, and the page. */
async function bench(protocolChanges: Partial<Protocol> = {}, phases = ['before']): Promise<Bench> {
  const services = fakeServices();
  const { study, classroom, protocol } = await studyWithClass(services);
  must(await addObserver(services.deps, study.id, 'Quill'));
  const wish = {
    classroom: classroom.id,
    protocol: { id: protocol.id },
    phases,
    absent: [],
    plannedStart: null,
  };
  const { plan: whole } = must(await prepareVisit(services.deps, wish));
  const plan: VisitPlan = {
    ...whole,
    children: whole.children.slice(0, 2),
    schedule: {
      ...whole.schedule,
      protocol: { ...whole.schedule.protocol, partLength: { kind: 'rounds', rounds: 2 }, ...protocolChanges },
    },
  };
  must(await services.store.saveSettings({ prepared: plan, study: study.id }));
  return {
    services,
    plan,
    user: userEvent.setup(),
    show: () => renderScreen(<TypePage />, services, '/before/paper/type'),
  };
}

/** Chooses the prepared visit and fills in the head of the sheet. */
async function begin({ user, show }: Bench) {
  const view = show();
  await user.click(await screen.findByRole('button', { name: /^Type it in/ }));
  await screen.findByRole('option', { name: 'Quill' });
  await user.selectOptions(screen.getByLabelText('Observer'), 'Quill');
  await user.clear(screen.getByLabelText('Date'));
  await user.type(screen.getByLabelText('Date'), '2026-11-02');
  await user.type(screen.getByLabelText('Started at'), '1041');
  return view;
}

async function keep({ user, services }: Bench) {
  await user.click(screen.getByRole('button', { name: 'Keep as a session' }));
  const study = must(await services.store.settings()).study ?? '';
  let id = '';
  await waitFor(async () => {
    id = must(await services.store.listSessions(study))[0]?.id ?? '';
    expect(must(await services.store.session(id))?.ended).not.toBeNull();
  });
  const stored = must(await services.store.readSession(id));
  if (stored === null) throw new Error('no session');
  return stored;
}

const said = (journal: readonly { kind: string }[]): string[] =>
  (journal as KnownEntry[]).filter(isKnown).flatMap((entry) => {
    if (entry.kind === 'marked')
      return `${entry.interval} ${entry.counts ? `${entry.counts.on}/${entry.counts.present}` : (entry.code ?? 'none')}`;
    return entry.kind === 'missing' ? `${entry.interval} ${entry.reason}` : [];
  });

const numberField = () => screen.getByLabelText('Number on this line');

describe('Typing in a sheet', () => {
  it('takes a whole sheet by keyboard alone, and keeps it as a session from paper', async () => {
    const on = await bench();
    const view = await begin(on);
    const [onTask, offTask] = on.plan.schedule.protocol.codeSet.codes.map(({ id }) => id);
    await on.user.click(numberField());
    await on.user.keyboard('1{Enter}05');
    expect(screen.getByText('End of the schedule.')).toBeTruthy();
    // One number too many, then up to the second line, which was left empty.
    await on.user.keyboard('1');
    expect(screen.getByRole('alert').textContent).toContain('The schedule ends with line 4.');
    await on.user.keyboard('{ArrowUp}{ArrowUp}{ArrowUp}2');
    const stored = await keep(on);
    expect(said(stored.journal)).toEqual([`1 ${onTask}`, `2 ${offTask}`, '3 out of view', '4 left the room']);
    expect(stored.header).toMatchObject({
      fromPaper: true,
      visit: on.plan.visit,
      observer: { name: 'Quill' },
      role: null,
      date: '2026-11-02',
    });
    expect(sessionDetails(stored).phases[0]?.row.percentOnTask).toBe(50);
    await waitFor(() => expect(view.visited.at(-1)).toBe(`/afterwards/session/${stored.header.id}`));
    expect(must(await on.services.store.settings())).toMatchObject({ paper: null, prepared: null });
  });

  it('adds an observer who is not on the list yet, as it is done before the visit', async () => {
    const on = await bench();
    await begin(on);
    await on.user.click(screen.getByRole('button', { name: 'Somebody else …' }));
    await on.user.type(screen.getByLabelText('Name of the observer'), 'quill{Enter}');
    expect((await screen.findByRole('alert')).textContent).toMatch(/quill/i);
    await on.user.clear(screen.getByLabelText('Name of the observer'));
    await on.user.type(screen.getByLabelText('Name of the observer'), 'Reed{Enter}');
    await waitFor(() => {
      const observer = screen.getByLabelText<HTMLSelectElement>('Observer');
      expect(observer.selectedOptions[0]?.textContent).toBe('Reed');
    });
    expect(screen.queryByLabelText('Name of the observer')).toBeNull();
    await on.user.click(numberField());
    await on.user.keyboard('1');
    expect((await keep(on)).header.observer.name).toBe('Reed');
  });

  it('says what a button of a line would do where there is nothing for it to do', async () => {
    const on = await bench();
    await begin(on);
    await on.user.click(screen.getByRole('button', { name: 'Line before' }));
    expect(screen.getByRole('alert').textContent).toBe('This is the first line.');
    await on.user.click(screen.getByRole('button', { name: 'Empty this line' }));
    expect(screen.getByRole('alert').textContent).toBe('This line is empty.');
    expect(screen.getByText('nothing to undo yet')).toBeTruthy();
  });

  it('takes over which reserve stepped in for whom, shows it on the lines, and keeps it in the record', async () => {
    const on = await bench({ reservesStepIn: true });
    await begin(on);
    const [first, second] = on.plan.children.map(({ pseudonym }) => pseudonym);
    const [reserve] = on.plan.reserves ?? [];
    const add = () => on.user.click(screen.getByRole('button', { name: 'Add the line' }));
    await on.user.selectOptions(screen.getByLabelText('Who was away'), first ?? '');
    await add();
    expect(screen.getByRole('alert').textContent).toMatch(/all four are needed/);
    await on.user.selectOptions(screen.getByLabelText('Why'), '6 with another adult');
    await on.user.selectOptions(screen.getByLabelText('Who stepped in'), reserve?.pseudonym ?? '');
    await on.user.type(screen.getByLabelText('From no.'), '9');
    await add();
    expect(screen.getByRole('alert').textContent).toMatch(
      /^Line 9 is not on this sheet, whose lines go from 1 to 4/,
    );
    await on.user.clear(screen.getByLabelText('From no.'));
    await on.user.type(screen.getByLabelText('From no.'), '3');
    await add();
    expect(
      screen.getByText(`${reserve?.pseudonym} for ${first} (with another adult) from no. 3 to the end`),
    ).toBeTruthy();
    const lines = within(screen.getByRole('list', { name: 'Lines' })).getAllByRole('listitem');
    expect(lines.map((line) => line.textContent?.replace(/^\d+\D?[\d:]+/, ''))).toEqual([
      first,
      second,
      `${reserve?.pseudonym} for ${first}`,
      second,
    ]);
    await on.user.click(numberField());
    await on.user.keyboard('1111');
    const stored = await keep(on);
    expect(stored.journal.find(({ kind }) => kind === 'left')).toMatchObject({
      child: on.plan.children[0]?.id,
      reason: 'with another adult',
      by: reserve?.id,
    });
    const children = readOut(fold(stored.header, stored.journal)).map(({ child }) => child);
    expect(children[2]).toBe(reserve?.id);
  });

  it('asks nothing of stepping in where the protocol has none', async () => {
    const on = await bench();
    await begin(on);
    expect(screen.queryByLabelText('Who stepped in')).toBeNull();
  });

  it('loses nothing in a reload, and goes on at the line after the last one typed', async () => {
    const on = await bench();
    await begin(on);
    await on.user.click(numberField());
    await on.user.keyboard('12');
    await screen.findByText('2 of 4 lines typed, kept as you type');
    cleanup();
    on.show();
    expect(await screen.findByText('2 of 4 lines typed, kept as you type')).toBeTruthy();
    expect(screen.getByText(/^No\. 3 · 0:45/)).toBeTruthy();
    expect(screen.getByLabelText<HTMLInputElement>('Started at').value).toBe('10:41');
  });

  it('takes lines back one by one, empties them, and refuses numbers that mean nothing', async () => {
    const on = await bench();
    await begin(on);
    await on.user.click(numberField());
    await on.user.keyboard('112');
    await on.user.click(screen.getByRole('button', { name: 'Undo' }));
    expect(screen.getByText(/^2 of 4 lines typed/)).toBeTruthy();
    expect(screen.getByText(/^No\. 3 /)).toBeTruthy();
    await on.user.click(numberField());
    await on.user.keyboard('4');
    expect(screen.getByRole('alert').textContent).toContain('4 means nothing on this sheet.');
    await on.user.keyboard('{Backspace}{Backspace}');
    expect(screen.getByText(/^1 of 4 lines typed/)).toBeTruthy();
    await on.user.keyboard('{Control>}z{/Control}');
    expect(screen.getByText(/^2 of 4 lines typed/)).toBeTruthy();
  });

  it('works by touch alone, with a line chosen from the list', async () => {
    const on = await bench();
    await begin(on);
    const rows = screen.getAllByRole('listitem');
    await on.user.click(within(rows[2] as HTMLElement).getByRole('button'));
    await on.user.click(screen.getByRole('button', { name: '2 off-task' }));
    expect(screen.getByText(/^No\. 4 /)).toBeTruthy();
    const [, , third] =
      must(await on.services.store.settings()).paper === null ? [] : screen.getAllByRole('listitem');
    expect(third?.textContent).toContain('off-task');
  });

  it('lets letters mean what they mean for this observer in the room', async () => {
    const on = await bench();
    const study = on.plan.study.id;
    const [observer] = must(await on.services.store.observers(study));
    if (observer === undefined) throw new Error('no observer');
    must(
      await saveObserver(on.services.deps, observer.id, {
        keyMap: { on: true, keys: { j: 'code:1', k: 'code:2' } },
      }),
    );
    await begin(on);
    await on.user.click(numberField());
    await on.user.keyboard('jkj');
    const [onTask, offTask] = on.plan.schedule.protocol.codeSet.codes.map(({ id }) => id);
    expect(said((await keep(on)).journal)).toEqual([`1 ${onTask}`, `2 ${offTask}`, `3 ${onTask}`]);
  });

  it('takes several codes and none of them in partial interval', async () => {
    const on = await bench({ method: 'partial', observeMs: 10_000 });
    await begin(on);
    await on.user.click(numberField());
    const [first, second] = on.plan.schedule.protocol.codeSet.codes.map(({ id }) => id);
    const none = on.plan.schedule.protocol.codeSet.codes.length + 1;
    // Both; none of them; the first typed twice is taken away again; cannot see.
    await on.user.keyboard(`12{Enter}${none}{Enter}11{Enter}0`);
    expect(said((await keep(on)).journal)).toEqual([`1 ${first}`, `1 ${second}`, '2 none', '4 out of view']);
  });

  it('takes headcounts, carries the number present along, and refuses more on-task than present', async () => {
    const on = await bench({ method: 'headcount', partLength: { kind: 'minutes', minutes: 1 } });
    await begin(on);
    await on.user.click(screen.getByLabelText('on-task'));
    await on.user.keyboard('21{Enter}20{Enter}');
    expect(screen.getByRole('alert').textContent).toContain('21 on-task of 20 present');
    await on.user.clear(screen.getByLabelText('on-task'));
    await on.user.type(screen.getByLabelText('on-task'), '18{Enter}{Enter}');
    expect(screen.getByText(/^No\. 2 /)).toBeTruthy();
    expect(screen.getByLabelText<HTMLInputElement>('present').value).toBe('20');
    await on.user.keyboard('15{Enter}{Enter}');
    await on.user.click(screen.getByRole('button', { name: '8 class interrupted' }));
    expect(said((await keep(on)).journal)).toEqual(['1 18/20', '2 15/20', '3 class interrupted']);
  });

  it('takes onsets of a duration in any order', async () => {
    const on = await bench({
      method: 'duration',
      rotation: { kind: 'one' },
      partLength: { kind: 'minutes', minutes: 10 },
    });
    await begin(on);
    const add = async (time: string, option: RegExp) => {
      await on.user.type(screen.getByLabelText('From (min:s)'), time);
      await on.user.selectOptions(
        screen.getByLabelText('What began'),
        screen.getByRole('option', { name: option }),
      );
      await on.user.click(screen.getByRole('button', { name: 'Add the line' }));
    };
    await add('6:00', /^2 /);
    await add('0:00', /^1 /);
    await add('12:00', /^1 /);
    expect(screen.getByRole('alert').textContent).toContain(
      '12:00 is outside of the part, which lasts until 10:00.',
    );
    expect(sessionDetails(await keep(on)).phases[0]?.row.percentOnTask).toBe(60);
  });

  it('says in one sentence what cannot be, and keeps nothing', async () => {
    const on = await bench({}, ['before', 'after']);
    await begin(on);
    await on.user.type(screen.getByLabelText('Break started'), '10:30');
    await on.user.type(screen.getByLabelText(/^First task given/), '10:52');
    await on.user.click(screen.getByRole('button', { name: 'Keep as a session' }));
    await screen.findByText('Nothing is typed in yet.');
    await on.user.click(numberField());
    await on.user.keyboard('1111');
    await on.user.click(screen.getByRole('button', { name: 'Keep as a session' }));
    await screen.findByText(/The break cannot have started at 10:30/);
    expect(must(await on.services.store.listSessions(on.plan.study.id))).toEqual([]);
  });

  it('says so when the tablet refuses to keep what is typed, and keeps it with the next key', async () => {
    const on = await bench();
    await begin(on);
    await screen.findByText(/kept as you type/);
    const { store } = on.services;
    const save = store.saveSettings;
    store.saveSettings = async () => problem('store.full');
    await on.user.click(numberField());
    await on.user.keyboard('1');
    expect((await screen.findAllByText(/disk|room|full/i)).length).toBeGreaterThan(0);
    store.saveSettings = save;
    await on.user.keyboard('2');
    await screen.findByText(/^2 of 4 lines typed, kept as you type/);
    expect(Object.keys(must(await store.settings()).paper?.answers ?? {})).toEqual(['1', '2']);
  });

  it('finds a sheet by its label, says when no schedule has it, and takes putting away back', async () => {
    const on = await bench();
    on.show();
    const label = await screen.findByLabelText('Label of the sheet');
    await on.user.type(label, 'zzz999{Enter}');
    expect((await screen.findByRole('alert')).textContent).toContain(
      'No schedule on this tablet has the label ZZZ-999.',
    );
    await on.user.clear(label);
    await on.user.type(label, `${sheetLabel(on.plan).toLowerCase()}{Enter}`);
    await on.user.click(await screen.findByLabelText('Number on this line'));
    await on.user.keyboard('1');
    await on.user.click(screen.getByRole('button', { name: 'Put the sheet away' }));
    await on.user.click(await screen.findByRole('button', { name: 'Undo' }));
    expect(await screen.findByText(/^1 of 4 lines typed/)).toBeTruthy();
  });
});
