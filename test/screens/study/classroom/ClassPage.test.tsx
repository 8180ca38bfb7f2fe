// @vitest-environment happy-dom
import { cleanup, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { StudyPages } from '../../../../src/screens/study/StudyPages.tsx';
import { newStudyTexts } from '../../../../src/screens/study/starterTexts.ts';
import {
  addClass,
  createStudy,
  importClassList,
  seatChild,
  setSeatingPlan,
  undoDraw,
} from '../../../../src/tasks/index.ts';
import { fakeServices, renderScreen } from '../../support/renderScreen.tsx';
import { studyWithClass } from '../../support/study.ts';
import { keepRecorded, must } from '../../support/studyOf.ts';

afterEach(cleanup);

/** The page of a class that has nobody in it yet, with no draw and no plan. */
async function emptyClass() {
  const services = fakeServices();
  const { deps, words, store } = services;
  const study = must(await createStudy(deps, { name: 'Breaks', texts: newStudyTexts(words) }));
  const classroom = must(await addClass(deps, study.id, { name: 'Class Otter', condition: 'break' }));
  renderScreen(<StudyPages />, services, `/study/class/${classroom.id}`);
  await screen.findByRole('heading', { level: 1, name: 'Class Otter has no children yet.' });
  return { children: async () => must(await store.classroom(classroom.id))?.children ?? [] };
}

/** The page of a class of eight of whom six are drawn, or nobody yet. */
async function classOfEight({ drawn = true } = {}) {
  const services = fakeServices();
  const made = await studyWithClass(services);
  if (!drawn) must(await undoDraw(services.deps, made.classroom.id));
  const open = async () => {
    const view = renderScreen(<StudyPages />, services, `/study/class/${made.classroom.id}`);
    await screen.findByRole('heading', { level: 1, name: /^Otter: 8 children/ });
    return view;
  };
  const stored = async () => {
    const found = must(await services.store.classroom(made.classroom.id));
    if (found === null) throw new Error('the class is gone');
    return found;
  };
  return { services, ...made, open, stored };
}

const button = (name: string | RegExp) => screen.getByRole('button', { name });
const tap = (name: string | RegExp) => userEvent.click(button(name));
const present = (children: readonly { pseudonym: string; removed: boolean }[]) =>
  children.filter((one) => !one.removed).map((one) => one.pseudonym);

describe('Writing children down', () => {
  it('asks for consent first, and writes nobody down without it', async () => {
    const { children } = await emptyClass();
    await tap('Write down Otter-01 to Otter-20');
    expect((await screen.findByRole('alert')).textContent).toMatch(/consent/);
    expect(await children()).toEqual([]);
  });

  it('writes numbered pseudonyms down at once, offers the next free one, and takes it back', async () => {
    const { children } = await emptyClass();
    const count = screen.getByLabelText('How many children?');
    await userEvent.clear(count);
    await userEvent.type(count, '3');
    await userEvent.click(screen.getByRole('checkbox', { name: /^Consent and assent/ }));
    await tap('Write down Otter-01 to Otter-03');
    await screen.findByRole('heading', { level: 1, name: 'Class Otter: 3 children, none drawn yet.' });
    expect(present(await children())).toEqual(['Otter-01', 'Otter-02', 'Otter-03']);
    await userEvent.click(screen.getByRole('radio', { name: 'One at a time' }));
    expect((screen.getByLabelText('Pseudonym') as HTMLInputElement).value).toBe('Otter-04');
    await userEvent.type(screen.getByLabelText('Stratum'), 'older');
    await userEvent.click(screen.getByRole('checkbox', { name: /^Consent and assent/ }));
    await tap('Write this child down');
    await screen.findByText('Otter-04 is written down.');
    expect((await children()).at(-1)).toMatchObject({ pseudonym: 'Otter-04', stratum: 'older' });
    await tap('Undo');
    await screen.findByText('Taken back.');
    expect(present(await children())).toEqual(['Otter-01', 'Otter-02', 'Otter-03']);
  });

  it('leaves lines of a pasted list without consent out, counts them, and keeps nothing of them', async () => {
    const { children } = await emptyClass();
    await userEvent.click(screen.getByRole('radio', { name: 'From a list' }));
    const lines = screen.getByLabelText('Lines') as HTMLTextAreaElement;
    await userEvent.click(lines);
    await userEvent.paste('Wren-01, yes\nWren-02, no\nWren-03, yes');
    await tap('Take over the lines');
    await screen.findByText(
      '2 children written down. 1 line was left out, without consent; nothing of it is kept.',
    );
    expect((await children()).map((one) => one.pseudonym)).toEqual(['Wren-01', 'Wren-03']);
    expect((screen.getByLabelText('Lines') as HTMLTextAreaElement).value).toBe('');
  });

  it('explains a list where it is pasted, and names the line of a seat that it cannot give', async () => {
    const { children } = await emptyClass();
    await userEvent.click(screen.getByRole('radio', { name: 'From a list' }));
    expect(
      screen.getByText(/such as Otter-01; or more with commas in this order: Otter-01, yes, year 3, B3/),
    ).toBeTruthy();
    expect(
      screen.getByText(/A group of which the draw takes its fair share, for example year 3/),
    ).toBeTruthy();
    expect(screen.getByText(/B3 or 2-3 is the second row, third place/)).toBeTruthy();
    await userEvent.click(screen.getByLabelText('Lines'));
    await userEvent.paste(
      ['B3', 'by the door', '2-3', 'Z9', '31', 'W1']
        .map((seat, k) => `Wren-0${k + 1}, yes, year 3, ${seat}`)
        .join('\n'),
    );
    await tap('Take over the lines');
    const said = (await screen.findByText(/^6 children written down/)).textContent;
    expect(said).toContain(
      'Line 2: seat “by the door” is not understood; expected a row and a place, such as B3 or 2-3.',
    );
    expect(said).toContain('Line 3: somebody else has seat “2-3”; expected a free one.');
    expect(said).toMatch(/2 more seats are left open\.$/);
    expect((await children()).map(({ stratum }) => stratum)).toEqual(Array(6).fill('year 3'));
  });

  it('keeps a pasted list of bare pseudonyms in the field until consent is said', async () => {
    const { children } = await emptyClass();
    await userEvent.click(screen.getByRole('radio', { name: 'From a list' }));
    await userEvent.click(screen.getByLabelText('Lines'));
    await userEvent.paste('Wren-01\nWren-02');
    await tap('Take over the lines');
    expect((await screen.findByRole('alert')).textContent).toMatch(/^The list says nothing of consent/);
    expect(await children()).toEqual([]);
    await userEvent.click(screen.getByRole('checkbox', { name: /^Consent and assent/ }));
    await tap('Take over the lines');
    await waitFor(async () => expect(present(await children())).toEqual(['Wren-01', 'Wren-02']));
  });

  it('takes a class list from a CSV file with its seats, and undoes all of it: children, strata and seats', async () => {
    const { services, classroom, open, stored } = await classOfEight();
    must(await setSeatingPlan(services.deps, classroom.id, { kind: 'pairs', columns: 1, rows: 1 }));
    must(
      await importClassList(services.deps, classroom.id, {
        content: 'child,consent,stratum\nOtter-01,yes,older',
      }),
    );
    const { container } = await open();
    const before = await stored();
    await tap('Add children');
    await userEvent.click(screen.getByRole('radio', { name: 'From a file' }));
    const input = container.querySelector<HTMLInputElement>('input[type=file]') as HTMLInputElement;
    const csv = 'child,consent,stratum,seat\nOtter-01,yes,younger,1\nOtter-09,yes,,2\nOtter-10,no,,3\n';
    await userEvent.upload(input, new File([csv], 'class.csv', { type: 'text/csv' }));
    await screen.findByText(
      '1 child written down, 1 changed. 1 line was left out, without consent; nothing of it is kept.',
    );
    const taken = await stored();
    expect(taken.plan?.seats.filter((seat) => seat.child !== null)).toHaveLength(2);
    expect(present(taken.children)).toContain('Otter-09');
    expect(JSON.stringify(taken)).not.toContain('Otter-10');
    await tap('Undo');
    await screen.findByText('Taken back.');
    const after = await stored();
    expect(after.plan).toEqual(before.plan);
    expect(after.children.filter((one) => !one.removed)).toEqual(before.children);
  });

  it('says in one sentence what is wrong with a file and takes nothing of it', async () => {
    const { open, stored } = await classOfEight();
    const { container } = await open();
    await tap('Add children');
    await userEvent.click(screen.getByRole('radio', { name: 'From a file' }));
    const input = container.querySelector<HTMLInputElement>('input[type=file]') as HTMLInputElement;
    const csv = 'child,consent\nOtter-09,yes\nOtter-11,maybe\n';
    await userEvent.upload(input, new File([csv], 'class.csv', { type: 'text/csv' }));
    expect((await screen.findByRole('alert')).textContent).toBe(
      'Line 3: consent is “maybe”; expected yes or no.',
    );
    expect((await stored()).children).toHaveLength(8);
  });
});

describe('A child of the class', () => {
  it('gets another pseudonym, but not one that somebody has', async () => {
    const { open, stored } = await classOfEight();
    await open();
    await tap('Otter-03');
    const field = screen.getByLabelText('Pseudonym') as HTMLInputElement;
    expect(document.activeElement).toBe(field);
    await userEvent.clear(field);
    await userEvent.type(field, 'Otter-04{Enter}');
    expect((await screen.findByRole('alert')).textContent).toMatch(/“Otter-04” already/);
    await userEvent.clear(field);
    await userEvent.type(field, 'Otter-33{Enter}');
    await screen.findByRole('button', { name: 'Otter-33' });
    await waitFor(() => expect(screen.queryByRole('form')).toBeNull());
    expect(present((await stored()).children)).toContain('Otter-33');
  });

  it('is withdrawn, in the draw with a sign, and comes back to its seat when that is undone', async () => {
    const { services, classroom, open, stored } = await classOfEight();
    const [first] = classroom.draw?.chosen ?? [];
    const name = classroom.children.find((one) => one.id === first)?.pseudonym ?? '';
    const { plan } = must(
      await setSeatingPlan(services.deps, classroom.id, { kind: 'pairs', columns: 1, rows: 1 }),
    );
    const seat = plan?.seats[1]?.id ?? '';
    must(await seatChild(services.deps, classroom.id, seat, first ?? ''));
    await open();
    const sitting = async () => (await stored()).plan?.seats.find((one) => one.child === first)?.id;
    await tap(name);
    await tap(`Withdraw ${name}`);
    await screen.findByText(`${name} is withdrawn: no longer drawn, seated or watched.`);
    expect(screen.queryByRole('button', { name })).toBeNull();
    expect(screen.getByText('withdrawn')).toBeTruthy();
    expect(await sitting()).toBeUndefined();
    await tap('Undo');
    await screen.findByRole('button', { name });
    expect(screen.queryByText('withdrawn')).toBeNull();
    expect(await sitting()).toBe(seat);
  });
});

describe('The draw', () => {
  it('has nobody to choose from in an empty class', async () => {
    await emptyClass();
    expect(
      await screen.findByText('Write the children down first; then chance can choose among them.'),
    ).toBeTruthy();
    expect(screen.queryByRole('button', { name: /^Draw/ })).toBeNull();
  });

  it('with a seed gives that seed’s order, with the reserves after it', async () => {
    // The same eight children, drawn with the same seed by the fixture.
    const { classroom, services, open, stored } = await classOfEight();
    const first = classroom.draw;
    must(await undoDraw(services.deps, classroom.id));
    await open();
    await userEvent.type(await screen.findByLabelText('Seed'), 'seed');
    await tap('Draw 6 and 2 in reserve');
    await screen.findByText('Seed seed, drawn from 8 children.');
    expect((await stored()).draw).toEqual(first);
    const names = (ids: readonly string[]) =>
      ids.map((id) => classroom.children.find((one) => one.id === id)?.pseudonym);
    const shown = screen
      .getAllByRole('list')
      .filter((one) => one.tagName === 'OL')
      .map((one) =>
        within(one)
          .getAllByText(/^Otter-/)
          .map((name) => name.textContent),
      );
    expect(shown).toEqual([names(first?.chosen ?? []), names(first?.reserves ?? [])]);
  });

  it('can be taken back while unused, and its seed stays in sight', async () => {
    const { open, stored } = await classOfEight();
    await open();
    await tap('Take the draw back');
    await screen.findByText(/The draw that you took back had the seed seed\.$/);
    expect((await stored()).draw).toBeNull();
  });

  it('stands once a session has used it', async () => {
    const { services, study, classroom, open, stored } = await classOfEight();
    await keepRecorded(services, {
      id: 'session-1',
      study: study.id,
      classroom: { id: classroom.id, name: classroom.name },
      draw: classroom.draw,
    });
    await open();
    await tap('Take the draw back');
    expect((await screen.findByRole('alert')).textContent).toMatch(/recorded with this draw, so it stands/);
    expect((await stored()).draw).toEqual(classroom.draw);
  });

  it('says how many children came after it', async () => {
    const { services, classroom, open } = await classOfEight();
    await open();
    must(await importClassList(services.deps, classroom.id, { content: 'Otter-09', consent: true }));
    await screen.findByText('1 child came after the draw and had no chance in it.');
  });
});

describe('The class itself', () => {
  it('is begun with a name and a condition, and leads to its children', async () => {
    const services = fakeServices();
    const { study } = await studyWithClass(services);
    must(await services.store.saveSettings({ study: study.id }));
    renderScreen(<StudyPages />, services, '/study/class/new');
    await userEvent.type(await screen.findByLabelText('Name of the class'), 'Otter');
    await tap('Add this class');
    expect((await screen.findByRole('alert')).textContent).toMatch(/“Otter” already/);
    await userEvent.clear(screen.getByLabelText('Name of the class'));
    await userEvent.type(screen.getByLabelText('Name of the class'), 'Heron');
    await userEvent.click(screen.getByRole('radio', { name: 'usual' }));
    await tap('Add this class');
    await screen.findByRole('heading', { level: 1, name: 'Heron has no children yet.' });
    const heron = must(await services.store.classes(study.id)).find((one) => one.name === 'Heron');
    expect(heron?.condition).toBe('usual');
  });

  it('gets another name and condition, and the former ones back', async () => {
    const { open, stored } = await classOfEight();
    await open();
    const field = screen.getByLabelText('Name of the class');
    await userEvent.clear(field);
    await userEvent.type(field, 'Newt');
    await userEvent.click(screen.getByRole('radio', { name: 'none' }));
    await tap('Save');
    await screen.findByRole('heading', { level: 1, name: /^Newt: / });
    expect(await stored()).toMatchObject({ name: 'Newt', condition: null });
    await tap('Undo');
    await screen.findByRole('heading', { level: 1, name: /^Otter: / });
    expect(await stored()).toMatchObject({ name: 'Otter', condition: 'break' });
    expect((screen.getByLabelText('Name of the class') as HTMLInputElement).value).toBe('Otter');
  });

  it('goes off the list, says so at a glance, and comes back from there', async () => {
    const { open, stored } = await classOfEight();
    const view = await open();
    await tap('Take this class off the list');
    await screen.findByText('Otter is off the list. Its recorded sessions stay.');
    expect(view.visited.at(-1)).toBe('/study');
    expect((await stored()).removed).toBe(true);
    await tap('Undo');
    expect(await screen.findByRole('link', { name: /^Otter/ })).toBeTruthy();
    expect((await stored()).removed).toBe(false);
  });

  it('is not there at an address of none, and that is said', async () => {
    renderScreen(<StudyPages />, fakeServices(), '/study/class/nowhere');
    expect((await screen.findByRole('heading', { level: 1 })).textContent).toMatch(
      /not here|no longer|not on/i,
    );
  });
});
