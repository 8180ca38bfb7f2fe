import { banned } from './banned.mjs';

/** @typedef {{ file: string, text: string, names: string[] }} Plant */

/** How a banned global is written. @param {string} name */
const use = (name) =>
  name === 'Date()' ? 'new Date()' : name.includes('.') || name === 'navigator' ? `${name}` : `${name}(1)`;

/** Uses that must be reported: every banned global in several guises, and the ways around. @type {Plant[]} */
const mustFail = [
  ...banned.flatMap(({ name }) => [
    { file: 'src/analysis/plant.ts', text: `export const x = () => ${use(name)};`, names: [name] },
    {
      file: 'src/screens/room/Plant.tsx',
      text: `export const X = () => <p>{${use(name)}}</p>;`,
      names: [name],
    },
    ...(name === 'Date()'
      ? []
      : [
          {
            file: 'src/recorder/plant.ts',
            text: `export const x = () => window.${use(name)};`,
            names: [name],
          },
        ]),
  ]),
  { file: 'src/kernel/plant.ts', text: 'export const x = Date();', names: ['Date()'] },
  { file: 'src/kernel/plant.ts', text: 'export const x = new globalThis.Date();', names: ['Date()'] },
  { file: 'src/kernel/plant.ts', text: 'const { now } = Date;\nexport const x = now;', names: ['Date.now'] },
  {
    file: 'src/kernel/plant.ts',
    text: 'const m = Math;\nexport const x = m.random();',
    names: ['Math.random'],
  },
  { file: 'src/kernel/plant.ts', text: "export const x = Math['random']();", names: ['Math.random'] },
  { file: 'src/kernel/plant.ts', text: "export const x = window['indexedDB'];", names: ['indexedDB'] },
  { file: 'src/kernel/plant.ts', text: 'export const x = { setTimeout };', names: ['setTimeout'] },
  { file: 'src/kernel/plant.ts', text: 'export const x = (now = Date.now) => now;', names: ['Date.now'] },
  { file: 'src/batch/ontask.ts', text: 'export const x = new Date();', names: ['Date()'] },
  { file: 'src/batch/main.ts', text: 'export const x = Math.random();', names: ['Math.random'] },
  { file: 'src/worker/entry.ts', text: 'export const x = Math.random();', names: ['Math.random'] },
];

/** Uses that look like it and are right. */
const mustPass = [
  ['src/analysis/plant.ts', 'export const x = new Date(0).getTime() + Date.UTC(2030, 0, 1) + Math.sqrt(2);'],
  ['src/analysis/plant.ts', 'export const x = (a: unknown): a is Date => a instanceof Date;'],
  ['src/recorder/plant.ts', 'export const x = (timers: Timers) => timers.setTimeout(() => 0, 5);'],
  ['src/recorder/plant.ts', 'export interface Timers { setTimeout(run: () => void, ms: number): number }'],
  ['src/recorder/plant.ts', 'export const x = (setTimeout: () => void) => setTimeout();'],
  [
    'src/recorder/plant.ts',
    "import { performance } from './performance.ts';\nexport const x = performance.now();",
  ],
  ['src/recorder/plant.ts', 'export type X = typeof globalThis.navigator;'],
  ['src/devices/plant.ts', 'export const x = () => navigator.vibrate(20) || performance.now();'],
  ['src/storage/plant.ts', 'export const x = () => indexedDB.open("x");'],
  ['src/app/plant.ts', 'export const x = () => setTimeout(() => Math.random(), 5);'],
  ['src/batch/main.ts', 'export const x = new Date();'],
].map(([file, text]) => ({ file: String(file), text: String(text), names: [] }));

export const plants = [...mustFail, ...mustPass];
