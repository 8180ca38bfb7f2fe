import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Bundle } from '../src/exchange/types.ts';
import { writeStudyFile } from '../src/exchange/writeStudyFile.ts';
import type { StoredSession } from '../src/journal/stored.ts';
import type { WallTime } from '../src/kernel/units.ts';
import { paperTable } from './demo/paperTable.ts';
import { classrooms, observers, protocol, study } from './demo/school.ts';
import { recordings } from './demo/visits.ts';

/** Writes the demo study: `npm run demo`. The same script gives the same files, byte by byte. */
const folder = join(import.meta.dirname, '..', 'demo-sessions');
const bundle = (sessions: StoredSession[]): Bundle => ({
  study,
  classes: classrooms,
  observers,
  protocols: [protocol],
  sessions,
  visitPlans: [],
});
const options = { exportedAt: '2026-11-30T16:00:00.000+00:00' as WallTime, app: 'demo' };

mkdirSync(folder, { recursive: true });
const { quill, marsh, paper } = recordings();
writeFileSync(join(folder, 'tablet-of-quill.lookbell.json'), await writeStudyFile(bundle(quill), options));
writeFileSync(join(folder, 'tablet-of-marsh.lookbell.json'), await writeStudyFile(bundle(marsh), options));
writeFileSync(join(folder, 'newt-on-paper.csv'), paper.map(paperTable).join(''));
