import { check } from './run/runners.mjs';
import { finish } from './run/summary.mjs';

finish(await check());
