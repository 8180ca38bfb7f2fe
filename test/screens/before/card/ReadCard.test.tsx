// @vitest-environment happy-dom
import { act, cleanup, fireEvent, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it } from 'vitest';
import { writePairingCard } from '../../../../src/exchange/pairingCard.ts';
import { qrMatrix } from '../../../../src/exchange/qrMatrix.ts';
import { canonicalJson } from '../../../../src/kernel/canonicalJson.ts';
import { ReadCard } from '../../../../src/screens/before/card/ReadCard.tsx';
import { Ready } from '../../../../src/screens/before/Ready.tsx';
import type { Device, Pixels } from '../../../../src/screens/services.ts';
import { preparedVisit } from '../../../exchange/cardVisits.ts';
import { codePixels, noCode } from '../../../support/codePixels.ts';
import { fakeDevice, fakeServices, renderScreen } from '../../support/renderScreen.tsx';
import { must } from '../../support/studyOf.ts';
import { handWound } from './handWound.ts';

afterEach(cleanup);

const usual = await preparedVisit({ children: 30, plan: { kind: 'pairs', columns: 5, rows: 3 } });
const other = await preparedVisit({ children: 8, plan: null });
const card = must(await writePairingCard(usual));
const otherCard = must(await writePairingCard(other));
const codes = card.parts.map((part) => codePixels(qrMatrix(part)));
const [first, second, third] = codes as [Pixels, Pixels, Pixels];

function reading(device: Partial<Device> = {}) {
  const services = fakeServices({ device: fakeDevice(device) });
  const view = renderScreen(<ReadCard />, services, '/before/card');
  return { services, ...view };
}

/** Pictures by the names of their files. */
const album = (pictures: Readonly<Record<string, Pixels>>): Partial<Device> => ({
  pixelsOf: async (picture) => pictures[(picture as File).name] ?? null,
});

const file = (name: string) => new File(['x'], name, { type: 'image/png' });

async function choose(container: HTMLElement, ...names: string[]) {
  const input = container.querySelector<HTMLInputElement>('input[type=file]');
  if (input === null) throw new Error('no way to choose pictures');
  await userEvent.upload(input, names.map(file));
}

async function type(text: string) {
  fireEvent.change(screen.getByLabelText('Text of the card'), { target: { value: text } });
  await userEvent.click(screen.getByRole('button', { name: 'Read the text' }));
}

const preview = () => screen.findByText(/^Class Otter: .*, in this order, by /);

describe('from the text', () => {
  it('shows what was read, keeps it only on request, and goes to the checks as the second observer', async () => {
    const { services, visited } = reading();
    await type(card.text.toLowerCase());
    expect((await preview()).textContent).toBe(
      `Class Otter: ${new Intl.ListFormat('en-GB').format(usual.children.map((c) => c.pseudonym))}, in this order, by “Next child, every 15 seconds”, to start on Tuesday 3 November at 10:40.`,
    );
    expect(must(await services.store.settings()).prepared).toBeNull();
    expect(must(await services.store.studies())).toEqual([]);
    await userEvent.click(screen.getByRole('button', { name: 'Take this visit over' }));
    await waitFor(() => expect(visited?.at(-1)).toBe('/before/ready/second'));
    const { prepared, study } = must(await services.store.settings());
    expect(canonicalJson(prepared)).toBe(canonicalJson(usual));
    expect(study).toBe(usual.study.id);
    const kept = must(await services.store.classroom(usual.classroom.id));
    expect(kept?.children.map(({ id }) => id)).toEqual(usual.children.map(({ id }) => id));
    const { id, version } = usual.schedule.protocol;
    expect(must(await services.store.protocol(id, version))).toEqual(usual.schedule.protocol);
  });

  it('can be left, and nothing is kept', async () => {
    const { services } = reading();
    await type(card.text);
    await preview();
    await userEvent.click(screen.getByRole('button', { name: 'Leave it' }));
    expect(screen.getByRole('heading', { level: 1 }).textContent).toBe(
      'Read the pairing card of the first tablet.',
    );
    expect(must(await services.store.studies())).toEqual([]);
  });

  it('says which prepared visit it would replace', async () => {
    const { services } = reading();
    must(
      await services.store.saveSettings({
        prepared: { ...other, classroom: { id: 'x', name: 'Class Newt' } },
      }),
    );
    await type(card.text);
    expect(
      await screen.findByText('It takes the place of the visit of Class Newt that is prepared here.'),
    ).toBeTruthy();
  });

  it.each([
    [
      'another text',
      'https://example.org',
      'This is no pairing card of Lookbell: it says “https://example.org”.',
    ],
    ['a text that is cut off', card.text.slice(0, 900), 'The text of the card ends in the middle.'],
    ['a newer card', card.text.replace('LB1', 'LB3'), 'made by a newer Lookbell; this one reads version 1'],
    [
      'a wrong line',
      `${card.text.slice(0, 60)}${card.text.slice(64)}`,
      'Line 2 of the card is not as it was written: “',
    ],
    [
      'wrong content',
      card.parts.join('\n').replace(/.\.$/, (end) => (end === 'C.' ? 'E.' : 'C.')),
      'a character is wrong or absent',
    ],
  ])('refuses %s in a sentence', async (_, text, sentence) => {
    const { services } = reading();
    await type(text);
    expect((await screen.findByRole('alert')).textContent).toContain(sentence);
    expect(screen.queryByText(/pictures? read/)).toBeNull();
    expect(must(await services.store.studies())).toEqual([]);
  });
});

describe('from pictures', () => {
  it('collects them in any order, with repeats, and says what is missing', async () => {
    const { container } = reading(album({ a: third, b: first, c: third, d: second }));
    await choose(container, 'a');
    expect(await screen.findByText('1 of 3 pictures read.')).toBeTruthy();
    await choose(container, 'b', 'c');
    expect(await screen.findByText('2 of 3 pictures read.')).toBeTruthy();
    expect(screen.getByText('Picture 2: still missing')).toBeTruthy();
    expect(screen.getByText('Picture 3: read')).toBeTruthy();
    await choose(container, 'd');
    expect(await preview()).toBeTruthy();
  });

  it('names the picture without a code, and the file that is no picture, and reads the others', async () => {
    const { container } = reading(album({ wall: noCode(), a: first }));
    await choose(container, 'wall', 'a');
    expect((await screen.findByRole('alert')).textContent).toContain('No square code was found in wall.');
    expect(screen.getByText('1 of 3 pictures read.')).toBeTruthy();
    await choose(container, 'letter.doc');
    await waitFor(() => expect(screen.getByRole('alert').textContent).toContain('letter.doc is no picture'));
  });

  it('refuses a picture of another card until one begins again', async () => {
    const pixels = codePixels(qrMatrix(otherCard.parts[0] ?? ''));
    const { container } = reading(album({ a: first, other: pixels }));
    await choose(container, 'a');
    await choose(container, 'other');
    expect((await screen.findByRole('alert')).textContent).toContain('This belongs to another card.');
    expect(screen.getByText('1 of 3 pictures read.')).toBeTruthy();
    await userEvent.click(screen.getByRole('button', { name: 'Begin again' }));
    await choose(container, 'other');
    expect((await preview()).textContent).toContain('Otter-08');
  });

  it('takes pictures that are pasted', async () => {
    reading(album({ a: first }));
    const paste = new Event('paste', { bubbles: true, cancelable: true });
    Object.assign(paste, { clipboardData: { files: [file('a')] } });
    act(() => {
      document.body.dispatchEvent(paste);
    });
    expect(await screen.findByText('1 of 3 pictures read.')).toBeTruthy();
    expect(paste.defaultPrevented).toBe(true);
  });
});

describe('with the camera', () => {
  it('looks until the whole card is read, and puts the camera away', async () => {
    const timer = handWound();
    const film: (Pixels | null)[] = [null, second, second, noCode(), first, third];
    let stopped = 0;
    reading({
      wakeIn: timer.wakeIn,
      openCamera: async () => ({
        frame: () => film.shift() ?? null,
        lost: () => false,
        stop: () => {
          stopped++;
        },
      }),
    });
    await userEvent.click(screen.getByRole('button', { name: 'Open the camera' }));
    await screen.findByText('Looking for the square …');
    await timer.next();
    expect(screen.getByText('1 of 3 pictures read.')).toBeTruthy();
    for (let i = 0; i < 3; i++) await timer.next();
    expect(screen.getByText('2 of 3 pictures read.')).toBeTruthy();
    await timer.next();
    expect(await preview()).toBeTruthy();
    await waitFor(() => expect(stopped).toBe(1));
    expect(timer.waiting()).toEqual([]);
  });

  it('is closed by hand, and when the page is left', async () => {
    let open = 0;
    const view = reading({
      openCamera: async () => {
        open++;
        return { frame: () => null, lost: () => false, stop: () => open-- };
      },
    });
    await userEvent.click(screen.getByRole('button', { name: 'Open the camera' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Close the camera' }));
    expect(open).toBe(0);
    await userEvent.click(screen.getByRole('button', { name: 'Open the camera' }));
    await screen.findByText('Looking for the square …');
    view.unmount();
    expect(open).toBe(0);
  });

  it('says it when the tablet takes the camera away', async () => {
    const timer = handWound();
    let lost = false;
    let stopped = false;
    reading({
      wakeIn: timer.wakeIn,
      openCamera: async () => ({
        frame: () => null,
        lost: () => lost,
        stop: () => {
          stopped = true;
        },
      }),
    });
    await userEvent.click(screen.getByRole('button', { name: 'Open the camera' }));
    await screen.findByText('Looking for the square …');
    lost = true;
    await timer.next();
    expect((await screen.findByRole('alert')).textContent).toContain('The camera does not answer');
    expect([stopped, timer.waiting()]).toEqual([true, []]);
  });

  it.each([
    ['refused', 'The camera is not allowed here.'],
    ['missing', 'No camera can be used here.'],
    ['busy', 'The camera does not answer'],
  ] as const)('says it when it is %s, and the other ways stay', async (answer, sentence) => {
    reading({ openCamera: async () => answer });
    await userEvent.click(screen.getByRole('button', { name: 'Open the camera' }));
    expect((await screen.findByRole('alert')).textContent).toContain(sentence);
    await type(card.text);
    expect(await preview()).toBeTruthy();
  });
});

it('has the second observer’s role chosen at the checks after a card', async () => {
  const services = fakeServices();
  must(await services.store.saveSettings({ prepared: usual }));
  renderScreen(<Ready as="second" />, services, '/before/ready/second');
  await userEvent.click(await screen.findByRole('button', { name: 'Choose' }));
  expect(screen.getByRole<HTMLInputElement>('radio', { name: /I check the first observer/ }).checked).toBe(
    true,
  );
});
