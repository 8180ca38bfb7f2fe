import { expectAccessible } from './support/accessible.ts';
import { savedFile } from './support/files.ts';
import { goIn, lookingAt, start, touch } from './support/observing.ts';
import { picture } from './support/picture.ts';
import { shortVisitFile } from './support/shortVisit.ts';
import { expect, test } from './support/test.ts';

test('the other observer’s record stays closed until one’s own of the visit has ended', async ({
  tablet,
  anotherTablet,
}) => {
  const second = await anotherTablet();
  const [one, two] = [await tablet.openApp(), await second.openApp()];
  const file = await shortVisitFile({
    key: 'closed',
    protocol: { partLength: { kind: 'rounds', rounds: 1 } },
  });
  const to = (page: typeof one, hash: string) => page.goto(`${page.url().split('#')[0]}${hash}`);

  // Marsh records the visit and hands it over; Quill has gone in and is not done.
  await goIn(two, file, { observer: 'Marsh', beside: /I check the first observer/ });
  await start(two);
  for (const child of ['Otter-01', 'Otter-02', 'Otter-03']) {
    await lookingAt(two, child);
    await touch(two, 'on-task');
  }
  await expect(two.getByRole('heading', { name: 'The session is over.' })).toBeVisible({ timeout: 20_000 });
  await to(two, '#/afterwards');
  await two.getByRole('button', { name: 'Hand over now' }).click();
  const { name, bytes } = await savedFile(two, () =>
    two.getByRole('button', { name: 'Share or save it' }).click(),
  );
  await goIn(one, file, { observer: 'Quill', beside: /a second observer checks mine/ });

  await to(one, '#/afterwards');
  await one
    .locator('input[type=file]')
    .first()
    .setInputFiles({ name, mimeType: 'application/json', buffer: bytes });
  await one.getByRole('button', { name: /^Take / }).click();
  await expect(one.getByText('closed until your own record of this visit has ended')).toBeVisible();
  await expect(one.getByRole('link', { name: 'Compare the two' })).toBeHidden();
  await one.getByRole('link', { name: 'Marsh' }).click();
  await expect(one.getByRole('heading', { level: 1 })).toHaveText('This record stays closed for now.');
  await expectAccessible(one);
  await picture(one, 'closed-record');
  const address = one.url();

  // Quill's own is closed at the door of the room: then it opens.
  await one.getByRole('link', { name: 'Go to your own record' }).click();
  await one.reload();
  await one.getByRole('button', { name: 'Close it for good' }).click();
  await one.getByRole('dialog').getByRole('button', { name: 'Close it', exact: true }).click();
  await one.goto(address);
  await expect(one.getByRole('heading', { level: 1 })).toHaveText('3 of 3 looks are scored.');
  await to(one, '#/afterwards');
  await expect(one.getByRole('link', { name: 'Compare the two' })).toBeVisible();
});
