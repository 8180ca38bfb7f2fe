import { afterEach, expect, it, vi } from 'vitest';
import { battery } from '../../src/devices/battery.ts';

afterEach(() => vi.unstubAllGlobals());

it('tells level and charging, and nothing else', async () => {
  vi.stubGlobal('navigator', {
    getBattery: async () => ({ level: 0.41, charging: true, dischargingTime: 9 }),
  });
  expect(await battery.read()).toEqual({ level: 0.41, charging: true });
});

it.each([
  ['has no such thing', {}],
  [
    'refuses it',
    {
      getBattery: async () => {
        throw new DOMException('not allowed', 'NotAllowedError');
      },
    },
  ],
])('is not known where the browser %s', async (_, navigator) => {
  vi.stubGlobal('navigator', navigator);
  expect(await battery.read()).toBeNull();
});
