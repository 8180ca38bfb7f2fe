import type { Page } from '@playwright/test';
import { expectAccessible } from './support/accessible.ts';
import { savedFile } from './support/files.ts';
import { goIn, lookingAt, start, touch } from './support/observing.ts';
import { picture } from './support/picture.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';

const asFile = ({ name, bytes }: { name: string; bytes: Buffer }) => ({
  name,
  mimeType: 'application/json',
  buffer: bytes,
});

/** Marks what the list says, child after child, and goes on to the figures. */
async function record(page: Page, marks: readonly string[]): Promise<void> {
  await start(page);
  for (const [i, mark] of marks.entries()) {
    await lookingAt(page, `Otter-0${(i % 3) + 1}`);
    await touch(page, mark);
  }
  await expect(page.getByRole('heading', { name: 'The session is over.' })).toBeVisible({ timeout: 20_000 });
  await page.getByRole('button', { name: 'Go to its figures' }).click();
}

test('two tablets share a schedule by a file, and their records meet in the agreement of the visit', async ({
  tablet,
  anotherTablet,
}) => {
  test.setTimeout(150_000);
  const second = await anotherTablet();
  const [one, two] = [await tablet.visitOnce(), await second.visitOnce()];
  await tablet.goOffline();
  await second.context.setOffline(true);

  // The first tablet prepares, hands the visit file over and goes in as primary.
  await one.goto(`${one.url().split('#')[0]}#/before`);
  await one
    .locator('input[type=file]')
    .setInputFiles(
      await shortVisitFile({ key: 'two', protocol: { partLength: { kind: 'rounds', rounds: 2 } } }),
    );
  await one.getByRole('button', { name: 'Choose' }).click();
  await one
    .getByRole('dialog')
    .getByRole('radio', { name: /a second observer checks mine/ })
    .check();
  await one.getByRole('dialog').getByRole('button', { name: 'Done' }).click();
  const visit = await savedFile(one, () =>
    one.getByRole('button', { name: 'Hand over the visit file' }).click(),
  );
  expect(visit.name).toMatch(/\.lookbell-visit\.json$/);
  await goIn(one, asFile(visit), { observer: 'Quill', beside: /a second observer checks mine/ });
  await goIn(two, asFile(visit), { observer: 'Marsh', beside: /I check the first observer/ });
  await expect(two.getByText('Both observers touch on “one”', { exact: false })).toBeVisible();

  await Promise.all([
    record(one, ['on-task', 'on-task', 'off-task', 'on-task', 'off-task', 'on-task']),
    record(two, ['on-task', 'off-task', 'off-task', 'on-task', 'off-task', 'cannot see']),
  ]);

  // "Not handed over" until the file has left the second tablet.
  await two.goto(`${two.url().split('#')[0]}#/afterwards`);
  await expect(two.getByText('Not handed over: 1')).toBeVisible();
  await two.getByRole('button', { name: 'Hand over now' }).click();
  const study = await savedFile(two, () => two.getByRole('button', { name: 'Share or save it' }).click());
  await expect(two.getByText('Everything is handed over.')).toBeVisible();

  await one.goto(`${one.url().split('#')[0]}#/afterwards`);
  await one.locator('input[type=file]').first().setInputFiles(asFile(study));
  await one.getByRole('button', { name: /^Take / }).click();
  await expect(one.getByRole('link', { name: /Compare the two/ })).toBeVisible();
  await expectAccessible(one);
  await picture(one, 'visits');
  await one.getByRole('link', { name: /Compare the two/ }).click();

  // By hand: five looks both scored, four alike. Rows Quill/Marsh on-off: 2 on-on, 1 on-off, 2 off-off. po = .8,
  // pe = (3·2 + 2·3)/25 = .48, kappa = .32/.52 = .615.
  await expect(one.getByRole('heading', { level: 1 })).toContainText('They agree on 4 of 5 looks. Kappa .62');
  await expectAccessible(one);
  await picture(one, 'agreement');
});
