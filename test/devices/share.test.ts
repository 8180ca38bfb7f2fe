// @vitest-environment happy-dom
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { share } from '../../src/devices/share.ts';

const file = { name: 'class.lookbell.json', type: 'application/json', bytes: new Uint8Array([1, 2, 3]) };

/** The browser's side: what it takes, how its sheet ends, and what was downloaded. */
let takes: boolean;
let sheet: () => Promise<void>;
let shared: File[];
let downloads: { name: string; href: string }[];
beforeEach(() => {
  vi.useFakeTimers();
  takes = true;
  sheet = async () => undefined;
  shared = [];
  downloads = [];
  vi.stubGlobal('navigator', {
    canShare: ({ files }: { files: File[] }) => takes && files.every((one) => one.size > 0),
    share: ({ files }: { files: File[] }) => {
      shared.push(...files);
      return sheet();
    },
    userActivation: { isActive: true },
  });
  vi.spyOn(URL, 'createObjectURL').mockReturnValue('blob:made');
  vi.spyOn(URL, 'revokeObjectURL').mockReturnValue(undefined);
  vi.spyOn(HTMLAnchorElement.prototype, 'click').mockImplementation(function (this: HTMLAnchorElement) {
    downloads.push({ name: this.download, href: this.href });
  });
});
afterEach(() => {
  vi.useRealTimers();
  vi.restoreAllMocks();
  vi.unstubAllGlobals();
});

const failing = (name: string) => () => Promise.reject(new DOMException('', name));

it('hands the real file to the sheet where it is taken', async () => {
  expect(await share.handOver(file)).toBe('shared');
  expect(shared.map(({ name, type, size }) => [name, type, size])).toEqual([[file.name, file.type, 3]]);
  expect(downloads).toEqual([]);
});

it('downloads where there is no sheet, or none for this type, and lets the link go later', async () => {
  takes = false;
  expect(await share.handOver(file)).toBe('saved');
  vi.stubGlobal('navigator', {});
  expect(await share.handOver(file)).toBe('saved');
  expect(downloads.map(({ name }) => name)).toEqual([file.name, file.name]);
  expect(document.querySelector('a')).toBeNull();
  expect(URL.revokeObjectURL).not.toHaveBeenCalled();
  vi.advanceTimersByTime(60_000);
  expect(URL.revokeObjectURL).toHaveBeenCalledTimes(2);
});

it('a sheet that was closed is not a download', async () => {
  sheet = failing('AbortError');
  expect(await share.handOver(file)).toBe('cancelled');
  expect(downloads).toEqual([]);
});

it('asks for another tap when this one is used up', async () => {
  sheet = failing('NotAllowedError');
  vi.stubGlobal('navigator', { ...navigator, userActivation: { isActive: false } });
  expect(await share.handOver(file)).toBe('again');
  expect(downloads).toEqual([]);
});

it.each(['NotAllowedError', 'DataError', 'TypeError'])(
  'downloads when the sheet fails (%s)',
  async (name) => {
    sheet = failing(name);
    expect(await share.handOver(file)).toBe('saved');
    expect(downloads).toHaveLength(1);
  },
);
