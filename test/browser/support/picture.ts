import type { Page } from '@playwright/test';

export const sizes = [
  { width: 1366, height: 1024 }, // 12-inch tablet, across
  { width: 800, height: 1280 }, // 8-inch tablet, upright
  { width: 390, height: 844 }, // phone
];

export const themes = { light: 'light', dim: 'dark' } as const;

type Theme = keyof typeof themes;

export interface PictureOptions {
  sizes?: { width: number; height: number }[];
  themes?: Theme[];
  /** The whole length of the page, not only what is seen. */
  fullPage?: boolean;
}

/** Waits until what was changed is painted with its own fonts. */
async function settled(page: Page): Promise<void> {
  await page.evaluate(async () => {
    await document.fonts.ready;
    for (let frame = 0; frame < 2; frame += 1) await new Promise(requestAnimationFrame);
  });
}

/**
 * Takes the page's picture at every size and in every theme, for somebody to look at:
 * pictures/<name>-<width>x<height>-<theme>.png. The theme is asked for as the system would (prefers-color-scheme).
 *
 * @returns the files
 */
export async function picture(page: Page, name: string, options: PictureOptions = {}): Promise<string[]> {
  const before = page.viewportSize();
  const files: string[] = [];
  for (const size of options.sizes ?? sizes) {
    await page.setViewportSize(size);
    for (const theme of options.themes ?? (Object.keys(themes) as Theme[])) {
      await page.emulateMedia({ colorScheme: themes[theme], reducedMotion: 'reduce' });
      await settled(page);
      const path = `pictures/${name}-${size.width}x${size.height}-${theme}.png`;
      await page.screenshot({ path, fullPage: options.fullPage ?? false, animations: 'disabled' });
      files.push(path);
    }
  }
  await page.emulateMedia({ colorScheme: null, reducedMotion: null });
  if (before) await page.setViewportSize(before);
  return files;
}
