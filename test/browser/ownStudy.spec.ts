import { expectAccessible } from './support/accessible.ts';
import { throughTheDoor } from './support/observing.ts';
import { picture } from './support/picture.ts';
import { expect, test } from './support/test.ts';

test('from nothing to the classroom door: study, class, children, seats, draw, protocol, visit', async ({
  tablet,
}) => {
  const page = await tablet.visitOnce();
  await tablet.goOffline();

  await page.getByRole('link', { name: 'The study', exact: true }).click();
  await page.getByLabel(/Name of the study/).fill('Breaks before reading');
  await page.getByRole('button', { name: 'Begin this study' }).click();

  await page.getByLabel('Name of the class').fill('Otter');
  await page.getByRole('button', { name: 'Add this class' }).click();
  await page.getByText('From a list').click();
  await page
    .getByLabel('Lines')
    .fill(
      [
        'child,consent,stratum,seat',
        ...Array.from(
          { length: 8 },
          (_, i) => `Otter-0${i + 1},${i === 7 ? 'no' : 'yes'},${i % 2 ? 'A' : 'B'},`,
        ),
      ].join('\n'),
    );
  await page.getByRole('button', { name: 'Take over the lines' }).click();
  await expect(
    page.getByText('7 children written down. 1 line was left out', { exact: false }),
  ).toBeVisible();

  await page
    .getByRole('link', { name: /seating plan/i })
    .first()
    .click();
  await page.getByRole('button', { name: /^Put up \d+ seats/ }).click();
  await page.getByRole('button', { name: 'Otter-01' }).first().click();
  await page.getByRole('button', { name: /^Free seat, row 1, place 1/ }).click();
  await expect(page.getByRole('button', { name: /^Otter-01, row 1, place 1/ })).toBeVisible();
  await expectAccessible(page);
  await picture(page, 'own-seats');

  await page.goto(`${page.url().split('#')[0]}#/study/protocols/new`);
  await page.getByLabel('Name of the protocol').fill('A quick try');
  await page.getByLabel('Interval, in seconds').fill('5');
  await page.getByText('by rounds').click();
  await page.getByLabel('Rounds a part').fill('2');
  await page.getByRole('button', { name: 'Keep this protocol' }).click();
  await expect(page.getByText('A quick try is kept as version 1.')).toBeVisible();

  await page.getByRole('link', { name: 'Before the visit' }).click();
  await page.getByRole('radio', { name: /A quick try/ }).check();
  await page.getByRole('button', { name: 'Draw 6 at random' }).click();
  await expect(page.getByText(/^2 looks a child/)).toBeVisible();
  await page.getByRole('button', { name: 'Prepare the visit' }).click();
  await expect(page.getByRole('heading', { level: 1 })).toHaveText(/things before you go in\.$/);
  await expectAccessible(page);
  await picture(page, 'checks');

  // The protocol is used now: an edit makes a new version, and the draw stands.
  await page.goto(`${page.url().split('#')[0]}#/study`);
  await page.getByRole('link', { name: /A quick try/ }).click();
  await expect(page.getByText(/Version 1 was used and stays as it is/)).toBeVisible();
});

test('the first try as the readme tells it: from the demo study to a recording that is over in a minute', async ({
  tablet,
}) => {
  const page = await tablet.visitOnce();
  await tablet.goOffline();
  await expect(page.getByText('Lookbell', { exact: true }).first()).toBeVisible();
  await page.getByRole('button', { name: 'Open the demo study' }).click();
  await page.getByRole('radio', { name: /Otter/ }).check();
  await page.getByRole('button', { name: 'Try it for a minute' }).click();
  await expect(page.getByText('2 looks a child in 1 minute, 6 children.')).toBeVisible();
  await expectAccessible(page);
  await picture(page, 'try-short');
  await page.getByRole('button', { name: 'Prepare the visit' }).click();

  // A touch too early leads to what is missing; it is a touch all the same, though the button says that it waits.
  await page.getByRole('button', { name: 'Go in anyway' }).click({ force: true });
  const dialog = page.getByRole('dialog', { name: 'Who records on this tablet?' });
  await dialog.getByRole('radio', { name: 'Quill' }).check();
  await dialog.getByRole('radio', { name: /^practice/ }).check();
  await dialog.getByRole('button', { name: 'Done' }).click();
  await throughTheDoor(page);
  await page.getByRole('button', { name: 'Start' }).click();
  await expect(page.getByRole('img', { name: /interval \d+ of 12;/ })).toBeVisible({ timeout: 20_000 });
});
