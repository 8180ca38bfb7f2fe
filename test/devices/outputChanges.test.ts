import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { tellsOutputChanges, watchOutputs } from '../../src/devices/outputChanges.ts';

/** The browser's list of devices: outputs come and go, and an input is always there. */
class Devices extends EventTarget {
  ondevicechange = null;
  outputs = 1;
  refuses = false;
  enumerateDevices = async () => {
    if (this.refuses) throw new DOMException('no', 'NotAllowedError');
    return [{ kind: 'audioinput' }, ...Array.from({ length: this.outputs }, () => ({ kind: 'audiooutput' }))];
  };
  async become(outputs: number): Promise<void> {
    this.outputs = outputs;
    this.dispatchEvent(new Event('devicechange'));
    await vi.waitFor(() => expect(told.length).toBe(expected));
  }
}

let devices: Devices;
let told: string[];
let expected: number;
beforeEach(() => {
  devices = new Devices();
  told = [];
  expected = 0;
  vi.stubGlobal('navigator', { mediaDevices: devices });
  vi.stubGlobal(
    'AudioContext',
    class {
      setSinkId(): void {}
    },
  );
});
afterEach(() => vi.unstubAllGlobals());

it('tells apart an output that came and one that went', async () => {
  const stop = watchOutputs((change) => told.push(change));
  for (const [outputs, count] of [
    [2, 1],
    [3, 2],
    [1, 3],
  ] as const) {
    expected = count;
    await devices.become(outputs);
  }
  expect(told).toEqual(['new', 'new', 'gone']);
  stop();
  await devices.become(0);
  expect(told).toHaveLength(3);
});

it('takes a change of which nobody can say what it was for one that went', async () => {
  watchOutputs((change) => told.push(change));
  expected = 1;
  // One output before and after: the list does not grow without permission for the microphone.
  await devices.become(1);
  devices.refuses = true;
  expected = 2;
  await devices.become(2);
  expect(told).toEqual(['gone', 'gone']);
});

it.each([
  ['there is no list of devices', () => vi.stubGlobal('navigator', {})],
  ['the list never changes', () => vi.stubGlobal('navigator', { mediaDevices: {} })],
  ['no output can be chosen, as on tablets', () => vi.stubGlobal('AudioContext', class {})],
])('says that it tells nothing where %s', (_, spoil) => {
  expect(tellsOutputChanges()).toBe(true);
  spoil();
  expect(tellsOutputChanges()).toBe(false);
  expect(() => watchOutputs(() => told.push('?'))()).not.toThrow();
});
