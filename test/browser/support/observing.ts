import { expect, type Page } from '@playwright/test';

type File = { name: string; mimeType: string; buffer: Buffer };

interface Going {
  readonly observer?: string;
  /** As the radio says: nobody, a second observer checks mine, I check the first observer. */
  readonly beside?: RegExp;
}

/** From a visit file to the checks at the classroom door, all of them answered, and in. */
export async function goIn(
  page: Page,
  file: File,
  { observer = 'Quill', beside = /nobody/ }: Going = {},
): Promise<void> {
  await page.goto(`${page.url().split('#')[0]}#/before`);
  await page.locator('input[type=file]').setInputFiles(file);
  await goInAs(page, observer, beside);
}

/** Who records, and beside whom (null leaves that as it stands); then through the door. */
export async function goInAs(page: Page, observer: string, beside: RegExp | null): Promise<void> {
  await page.getByRole('button', { name: 'Choose' }).click();
  const dialog = page.getByRole('dialog');
  const known = dialog.getByRole('radio', { name: observer, exact: true });
  if ((await known.count()) > 0) await known.check();
  else {
    await dialog.getByLabel('Name of the observer').fill(observer);
    await dialog.getByRole('button', { name: 'Add' }).click();
    await expect(known).toBeChecked();
  }
  if (beside !== null) await dialog.getByRole('radio', { name: beside }).check();
  await dialog.getByRole('button', { name: 'Done' }).click();
  await throughTheDoor(page);
}

/** Answers the checks that only an observer can answer, and goes in. */
export async function throughTheDoor(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Play tone' }).click();
  await page.getByRole('button', { name: 'In my ear' }).click();
  await page.getByRole('button', { name: 'All are here' }).click();
  await page.getByRole('button', { name: /^Go in/ }).click();
  await page.waitForURL(/#\/room\/./);
}

/** Touches the glass in the middle of a target, as a finger does. */
export async function touch(page: Page, name: string): Promise<void> {
  const target = page.getByRole('button', { name: new RegExp(`^${name}`) });
  const box = await target.boundingBox();
  if (box === null) throw new Error(`no target ${name}`);
  await page.touchscreen.tap(box.x + box.width / 2, box.y + box.height / 2);
}

/** The tap that begins; the count-in follows. */
export async function start(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'Start' }).click();
}

/** Waits until this child is to be looked at: its cue has come. */
export async function lookingAt(page: Page, child: string): Promise<void> {
  await expect(page.locator('.look-lead', { hasText: 'look at' })).toBeVisible({ timeout: 20_000 });
  await expect(page.locator('h1.look-name', { hasText: child })).toBeVisible({ timeout: 20_000 });
}
