import { recorderBudget, recorderScripts, together } from '../../tools/bench/recorderScripts.ts';
import { sessionOf } from './support/kept.ts';
import { goIn, lookingAt, start } from './support/observing.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';

test('what the recorder loads is known, script by script, and within its budget', async ({ tablet }) => {
  const file = await shortVisitFile({
    key: 'size',
    protocol: { partLength: { kind: 'rounds', rounds: 40 } },
  });
  const before = await tablet.openApp();
  await goIn(before, file);
  const session = sessionOf(before);
  await start(before);
  await lookingAt(before, 'Otter-01');
  await before.close();

  // A page that has loaded nothing yet, at the address of the session that was cut off.
  const page = await tablet.context.newPage();
  const asked: string[] = [];
  page.on('request', (request) => {
    const [file] = /assets\/[^/]+\.js$/.exec(new URL(request.url()).pathname) ?? [];
    if (file !== undefined) asked.push(file);
  });
  await page.goto(`${tablet.site.url}#/room/${session}`);
  await page.getByRole('button', { name: 'Go on' }).click();
  await expect(page.locator('.look-lead', { hasText: 'look at' })).toBeVisible({ timeout: 20_000 });

  const scripts = recorderScripts();
  expect([...new Set(asked)].sort()).toEqual(scripts.map(({ file }) => file).sort());
  expect(together(scripts)).toBeLessThanOrEqual(recorderBudget);
});
