import type { Format } from '../../format.ts';

type F = Format;

const actionNames: Readonly<Record<string, string>> = {
  'cannot see': 'cannot see',
  nothing: 'nothing of it',
  'child before': 'child before',
  undo: 'undo',
  silence: 'silence the prompts',
  flag: 'flag',
  cover: 'cover the glass',
  'one more': 'one more (headcount)',
  'one fewer': 'one fewer (headcount)',
  'same again': 'same as last time (headcount)',
};

const keyNames: Readonly<Record<string, string>> = {
  PageDown: 'Page down',
  PageUp: 'Page up',
  ArrowUp: '↑',
  ArrowDown: '↓',
  ArrowLeft: '←',
  ArrowRight: '→',
  ' ': 'Space',
};

/** Observers and their keys. */
export const observerWords = {
  observersTitle: ({ n }: { n: number }, f: F) =>
    n === 0
      ? 'Who observes?'
      : `${f.whole(n)} ${f.plural(n, { one: 'observer', other: 'observers' })}, by initials or working name.`,
  observerName: 'Initials or working name',
  addObserver: 'Add this observer',
  rename: 'Rename',
  renameOf: ({ name }: { name: string }) => `Rename ${name}`,
  removeOf: ({ name }: { name: string }) => `Remove ${name}`,
  observerRemoved: ({ name }: { name: string }) =>
    `${name} is off the list. Recorded sessions keep the name.`,
  observerRenamed: ({ name }: { name: string }) => `Now called ${name}.`,
  keys: 'Keys',
  keysOf: ({ name }: { name: string }) => `Keys of ${name}`,
  keysHide: 'Close the keys',
  keysNote:
    'For a keyboard or a page-turner. They work only while a lesson is recorded, and never while you type. Code 1 is the first code of the protocol that you record with, code 2 the second.',
  manner: 'Layout and hand',
  mannerHide: 'Close layout and hand',
  mannerChanged: 'Layout and answers are changed.',
  mannerOf: ({ name }: { name: string }) => `Layout and hand of ${name}`,
  keysOn: 'Keys work in the room',
  keyAction: ({ action }: { action: string }) => actionNames[action] ?? action,
  keyCode: ({ n }: { n: number }, f: F) => `code ${f.whole(n)}`,
  keyLabel: ({ key }: { key: string }) => keyNames[key] ?? ([...key].length === 1 ? key.toUpperCase() : key),
  noKey: 'no key',
  addKey: 'Add a key',
  addKeyFor: ({ action }: { action: string }) => `Add a key for ${action}`,
  takeKeyAway: ({ key, action }: { key: string; action: string }) => `Take ${key} away from ${action}`,
  pressKey: ({ action }: { action: string }) => `Press the key for ${action}.`,
  pressKeyText: 'Escape leaves everything as it is.',
  keyTaken: ({ key, action }: { key: string; action: string }) =>
    `${key} already means ${action}. Take it away there first, or press another key.`,
  keyKept: ({ key }: { key: string }) => `The page itself needs ${key}. Press another key.`,
  usualKeys: 'Back to the usual keys',
  usualKeysNow: 'these are the usual keys',
  keysChanged: 'The keys are changed.',
} as const;
