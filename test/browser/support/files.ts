import { readFileSync } from 'node:fs';
import type { Page } from '@playwright/test';

/** Does what makes the app hand out a file, and returns its name and bytes. */
export async function savedFile(
  page: Page,
  act: () => Promise<unknown>,
): Promise<{ name: string; bytes: Buffer }> {
  const [download] = await Promise.all([page.waitForEvent('download'), act()]);
  return { name: download.suggestedFilename(), bytes: readFileSync(await download.path()) };
}

/** Does what makes the app ask for a file, and gives it one. */
export async function giveFile(
  page: Page,
  act: () => Promise<unknown>,
  file: string | { name: string; mimeType: string; buffer: Buffer },
): Promise<void> {
  const [chooser] = await Promise.all([page.waitForEvent('filechooser'), act()]);
  await chooser.setFiles(file);
}
