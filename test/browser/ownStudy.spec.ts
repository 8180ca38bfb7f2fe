import { expectAccessible } from './support/accessible.ts';
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
