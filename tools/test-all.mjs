import { findChromium } from './find-chromium.mjs';
import { browser, build, check } from './run/runners.mjs';
import { finish } from './run/summary.mjs';

/** @type {import('./run/summary.mjs').Result[]} */
const results = [];
// First of all: if a browser has to be installed, better now than after minutes of tests.
const found = findChromium({ install: true });
console.log(found.said);
results.push(...(await check()));
const built = await build();
results.push(built);
if (!found.path) results.push({ name: 'browser', passed: 0, failed: 1, note: 'no browser' });
else if (built.failed > 0) results.push({ name: 'browser', passed: 0, failed: 1, note: 'not built' });
else results.push(await browser());
finish(results);
