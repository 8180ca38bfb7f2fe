import { existsSync } from 'node:fs';
import { findChromium } from '../../../tools/find-chromium.mjs';

/** Says once, before all tests, what would fail every one of them. */
export default function globalSetup() {
  if (!existsSync('dist/sw.js'))
    throw new Error('There is no built app in dist/: run "npm run build" first.');
  const { path, said } = findChromium();
  if (!path) throw new Error(said);
  // Read by every launch, so that the search is made once.
  process.env.CHROMIUM = path;
}
