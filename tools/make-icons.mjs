// Renders public/icon.svg into the pictures that tablets ask for: npm run icons
import { readFileSync, writeFileSync } from 'node:fs';
import { chromium } from '@playwright/test';
import { chromiumFlags, findChromium } from './find-chromium.mjs';

const drawing = readFileSync('public/icon.svg', 'utf8');

/**
 * A square without corners of its own, for systems that cut it to their shape: whatever lies outside of the
 * middle four fifths may be cut off, so the drawing shrinks.
 *
 * @param {number} share
 */
const fullBleed = (share) =>
  drawing
    .replace(' rx="104"', '')
    .replace('<g id="drawing">', `<g transform="translate(256 256) scale(${share}) translate(-256 -265)">`);

const pictures = [
  { file: 'icon-192.png', size: 192, svg: drawing },
  { file: 'icon-512.png', size: 512, svg: drawing },
  { file: 'icon-maskable-512.png', size: 512, svg: fullBleed(0.8) },
  { file: 'apple-touch-icon-180.png', size: 180, svg: fullBleed(0.9) },
];

const { path, said } = findChromium({ install: true });
if (!path) throw new Error(said);
const browser = await chromium.launch({ executablePath: path, args: chromiumFlags });
const page = await browser.newPage();
for (const { file, size, svg } of pictures) {
  await page.setViewportSize({ width: size, height: size });
  await page.setContent(`<style>body{margin:0}svg{display:block;width:100vw;height:100vh}</style>${svg}`);
  writeFileSync(`public/${file}`, await page.screenshot({ omitBackground: true }));
  console.log(`public/${file}`);
}
await browser.close();
