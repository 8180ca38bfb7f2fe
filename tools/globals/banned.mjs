/**
 * What the browser and Node hand to everybody, and what Lookbell hands out instead:
 *
 * - `instead` is said to whoever used it.
 * - `name`: a global used as a value, or `Object.member` of one. `Date()` is a date without an argument.
 */
const clock = ['Date.now', 'Date()', 'performance', 'Temporal.Now'].map((name) => ({
  name,
  instead: 'take the clock as an argument (recorder/ports.ts)',
}));

const timers = [
  'setTimeout',
  'setInterval',
  'setImmediate',
  'clearTimeout',
  'clearInterval',
  'requestAnimationFrame',
  'cancelAnimationFrame',
  'requestIdleCallback',
].map((name) => ({ name, instead: 'take the timer as an argument (recorder/ports.ts)' }));

const random = ['Math.random', 'crypto.getRandomValues'].map((name) => ({
  name,
  instead: 'take a seeded generator as an argument (kernel)',
}));

const ids = [{ name: 'crypto.randomUUID', instead: 'take the maker of ids as an argument (tasks/ports.ts)' }];

const stores = ['indexedDB', 'localStorage', 'sessionStorage', 'caches'].map((name) => ({
  name,
  instead: 'go through the store port (tasks/ports.ts), whose adapter is in src/storage',
}));

const device = [{ name: 'navigator', instead: 'go through a port whose adapter is in src/devices' }];

const network = ['fetch', 'XMLHttpRequest', 'WebSocket', 'EventSource'].map((name) => ({
  name,
  instead: 'Lookbell asks nobody; what the app brings along is read in src/app',
}));

/** @type {{ name: string, instead: string }[]} */
export const banned = [...clock, ...timers, ...random, ...ids, ...stores, ...device, ...network];

/** The adapters, where the world is let in. */
export const adapters = ['src/devices/', 'src/storage/', 'src/app/'];

/**
 * Single entry files that may use some of it, since nobody above them could hand it in.
 *
 * @type {{ file: RegExp, names: string[] }[]}
 */
export const entries = [
  { file: /^src\/worker\/(entry|main|worker)\.ts$/, names: ['indexedDB', 'navigator', 'performance'] },
  { file: /^src\/batch\/main\.ts$/, names: ['Date.now', 'Date()', 'performance'] },
];

/** Objects under which the globals can be had as well. */
export const globalObjects = ['globalThis', 'window', 'self', 'global'];
