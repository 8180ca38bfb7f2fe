import { recorderBudget, recorderScripts, together } from '../../tools/bench/recorderScripts.ts';
import type { Bench } from '../../tools/bench.ts';

export const bench: Bench = {
  name: "The recorder's JavaScript, gzip",
  run: () => {
    const scripts = recorderScripts();
    return [
      { label: 'together', value: together(scripts), unit: 'kB', most: recorderBudget },
      ...scripts.map(({ file, kB }) => ({ label: file, value: kB, unit: 'kB', ratio: null })),
    ];
  },
};
