/**
 * Who may import whom. A floor is a folder under src/; what is not allowed here is forbidden.
 *
 * - `floors`: floors whose every module may be imported.
 * - `types`: floors, or single files, of which only types may be imported (`import type`).
 * - `files`: single files of another floor that may be imported with their values.
 * - `lazily`: floors that may be imported only by `import()` (or by files that `lazyFiles` names).
 *
 * @typedef {{ floors: string[], types?: string[], files?: string[], lazily?: string[], lazyFiles?: string }} Allowance
 * @type {Record<string, Allowance>}
 */
export const floors = {
  kernel: { floors: [] },
  stats: { floors: [] },
  model: { floors: ['kernel'] },
  schedule: { floors: ['kernel', 'model'] },
  journal: { floors: ['kernel', 'model', 'schedule'] },
  analysis: { floors: ['kernel', 'model', 'schedule', 'journal', 'stats'] },
  exchange: { floors: ['kernel', 'model', 'schedule', 'journal'] },
  storage: { floors: ['kernel', 'model', 'journal'], types: ['tasks/ports.ts', 'recorder/ports.ts'] },
  devices: { floors: ['kernel', 'model'], types: ['recorder/ports.ts'], files: ['recorder/cuePatterns.ts'] },
  recorder: { floors: ['kernel', 'model', 'schedule', 'journal'] },
  tasks: { floors: ['kernel', 'model', 'schedule', 'journal', 'exchange'] },
  worker: { floors: ['kernel', 'model', 'journal', 'analysis', 'storage'], files: ['tasks/ports.ts'] },
  batch: { floors: ['kernel', 'model', 'journal', 'analysis', 'exchange', 'words'] },
  words: { floors: ['kernel'], types: ['model', 'journal', 'analysis'] },
  ui: { floors: [] },
  charts: { floors: ['kernel'] },
  screens: {
    floors: ['ui', 'charts', 'words', 'tasks', 'recorder', 'model', 'schedule', 'journal', 'kernel'],
    types: ['analysis', 'worker'],
    // The Methods and checks screen recomputes each measure's check value; nothing else on a screen computes.
    lazily: ['stats'],
    lazyFiles: '/methods[^/]*(/|\\.tsx?$)',
  },
  app: {
    floors: [
      'kernel',
      'stats',
      'model',
      'schedule',
      'journal',
      'analysis',
      'exchange',
      'storage',
      'devices',
      'recorder',
      'tasks',
      'worker',
      'batch',
      'words',
      'ui',
      'charts',
      'screens',
    ],
  },
};

/**
 * The packages that src/ may use, and on which floors. A name ending in `/` stands for a whole scope.
 *
 * @type {Record<string, string[]>}
 */
export const packages = {
  '@fontsource-variable/': ['app', 'ui'],
  '@stdlib/': ['stats'],
  comlink: ['app', 'worker'],
  'd3-scale': ['charts'],
  'd3-shape': ['charts'],
  'date-fns': ['analysis', 'batch', 'exchange', 'screens', 'words'],
  fflate: ['exchange'],
  jsqr: ['exchange'],
  qrcode: ['exchange'],
  react: ['app', 'charts', 'screens', 'ui'],
  'react-dom': ['app', 'charts', 'screens', 'ui'],
  uuid: ['exchange', 'kernel'],
  'virtual:pwa-register': ['app'],
  'workbox-window': ['app'],
  wouter: ['app', 'screens'],
  zod: ['exchange', 'journal', 'model'],
};

/** Floors that run under Node and may use its built-in modules. */
export const nodeFloors = ['batch'];
