// npm run browser [-- arguments for Playwright]: the browser tests alone, on a fresh build.
// BUILT=1 takes the build that is there.
import { findChromium } from './find-chromium.mjs';
import { browser, build } from './run/runners.mjs';
import { finish } from './run/summary.mjs';

const found = findChromium({ install: true });
console.log(found.said);
if (!found.path) finish([{ name: 'browser', passed: 0, failed: 1, note: 'no browser' }]);
else {
  const built = process.env.BUILT ? undefined : await build();
  if (built && built.failed > 0) finish([built]);
  else finish([...(built ? [built] : []), await browser(process.argv.slice(2))]);
}
