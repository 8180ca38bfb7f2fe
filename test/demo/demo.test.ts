import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { beforeAll, describe, expect, it } from 'vitest';
import { agreementReport, changeReport, recordsOf, visits } from '../../src/analysis/index.ts';
import { readIncoming } from '../../src/exchange/readIncoming.ts';
import { writeStudyFile } from '../../src/exchange/writeStudyFile.ts';
import { readOut } from '../../src/journal/readOut.ts';
import { fold } from '../../src/journal/step.ts';
import type { StoredSession } from '../../src/journal/stored.ts';
import type { WallTime } from '../../src/kernel/units.ts';
import { observe, placeOf } from '../../tools/demo/observe.ts';
import { paperTable } from '../../tools/demo/paperTable.ts';
import { classrooms, observers, protocol, study } from '../../tools/demo/school.ts';
import { classes, errorOf, shareOf } from '../../tools/demo/truth.ts';
import { lessons, recordings } from '../../tools/demo/visits.ts';

const folder = join(import.meta.dirname, '../../demo-sessions');
const names = ['tablet-of-quill.lookbell.json', 'tablet-of-marsh.lookbell.json', 'newt-on-paper.csv'];
const sessions: StoredSession[] = [];

beforeAll(async () => {
  for (const name of names) {
    const read = await readIncoming({ name, bytes: new Uint8Array(readFileSync(join(folder, name))) });
    if (!read.ok) throw new Error(JSON.stringify(read.problems));
    sessions.push(...read.bundle.sessions);
  }
});

const outcomes = (session: StoredSession) => readOut(fold(session.header, session.journal));
const sessionOf = (className: string, number: number, observer = 'Quill') => {
  const date = lessons.find((l) => l.truth.name === className && l.number === number)?.start.slice(0, 10);
  const found = sessions.find(
    ({ header: h }) => h.classroom.name === className && h.date === date && h.observer.name === observer,
  );
  if (found === undefined) throw new Error(`no session of ${className} ${number}`);
  return found;
};

describe('the demo files', () => {
  it('are what the seeded script writes, byte by byte', async () => {
    const { quill, marsh, paper } = recordings();
    const options = { exportedAt: '2026-11-30T16:00:00.000+00:00' as WallTime, app: 'demo' };
    const rest = { study, classes: classrooms, observers, protocols: [protocol], visitPlans: [] };
    const same = async (name: string, kept: StoredSession[]) => {
      const made = Buffer.from(await writeStudyFile({ ...rest, sessions: kept }, options));
      expect(made.equals(readFileSync(join(folder, name)))).toBe(true);
    };
    await same('tablet-of-quill.lookbell.json', quill);
    await same('tablet-of-marsh.lookbell.json', marsh);
    expect(paper.map(paperTable).join('')).toBe(readFileSync(join(folder, 'newt-on-paper.csv'), 'utf8'));
  });

  it('hold twelve visits, four of them double-coded, one from paper', () => {
    expect(sessions).toHaveLength(16);
    const all = visits(recordsOf(sessions));
    expect(all).toHaveLength(24); // twelve visits in two phases each
    expect(all.filter((visit) => visit.records.length === 2)).toHaveLength(8);
  });

  it('run the schedule through the fire drill: four minutes at 15 s are 16 missing intervals, for both observers alike', () => {
    for (const observer of ['Quill', 'Marsh']) {
      const missing = outcomes(sessionOf('Heron', 2, observer)).filter(
        (line) => line.missing === 'class interrupted',
      );
      expect(missing.map((line) => line.number)).toEqual(Array.from({ length: 16 }, (_, i) => 20 + i));
    }
  });

  it('miss only the child who was taken out: three of its looks in five minutes of 90 s rounds', () => {
    const away = outcomes(sessionOf('Lark', 1)).filter((line) => line.missing === 'with another adult');
    expect(new Set(away.map((line) => line.child)).size).toBe(1);
    expect(away).toHaveLength(3);
  });
});

describe('the true values behind the demo', () => {
  const analysed = () => {
    const change = changeReport(visits(recordsOf(sessions)), { studyControl: 'usual' });
    if (!change.ok) throw new Error(change.problem.code);
    return change.value.report;
  };

  it('are recovered: each class’s change lies within four of its standard errors of what it really is', () => {
    for (const truth of classes) {
      const found = analysed().classes.find((c) => c.class === truth.name);
      expect(found?.children).toBe(6);
      // An observer who errs in e of her looks sees a change smaller by the factor 1 − 2e.
      const seen = 100 * truth.change * (1 - 2 * errorOf('Quill', 0));
      expect(Math.abs((found?.change ?? Number.NaN) - seen)).toBeLessThan(
        4 * (found?.standardError ?? Number.NaN),
      );
    }
  });

  it('are recovered: classes with a break gained about 14 points on those without, in the right direction', () => {
    const { comparison } = analysed();
    expect(comparison?.condition).toBe('break');
    expect(comparison?.control).toBe('usual');
    expect(comparison?.unit).toBe('class');
    const mean = (condition: string) => {
      const of = classes.filter((c) => c.condition === condition);
      return of.reduce((sum, c) => sum + c.change, 0) / of.length;
    };
    const seen = 100 * (mean('break') - mean('usual')) * (1 - 2 * errorOf('Quill', 0));
    expect(comparison?.lower).toBeLessThan(seen);
    expect(comparison?.upper).toBeGreaterThan(seen);
    expect(comparison?.difference).toBeGreaterThan(0);
  });

  it('show in Marsh’s kappa, which falls from her first double-coded visit to her last', () => {
    const { report } = agreementReport(visits(recordsOf(sessions)));
    const kappaOf = (name: string) => {
      const pairs = report.pairs.filter((pair) => pair.class === name);
      expect(pairs).toHaveLength(2);
      return pairs.reduce((sum, pair) => sum + (pair.kappa ?? Number.NaN), 0) / 2;
    };
    expect(kappaOf('Otter')).toBeGreaterThan(0.8);
    expect(kappaOf('Newt')).toBeLessThan(kappaOf('Otter') - 0.2);
    expect(report.overall.percentDoubleCoded).toBeCloseTo(100 / 3, 10);
  });

  it('are met without bias: 60 more lessons of one class, mean within four Monte-Carlo errors of the expectation', () => {
    const first = lessons[0];
    if (first === undefined) throw new Error('no lesson');
    const { truth, classroom } = first;
    const shares: number[] = [];
    for (let number = 100; number < 160; number++) {
      const session = observe(
        { ...first, number },
        { observer: 'Quill', role: null, visitsSoFar: 0, lateMs: 0 },
      );
      const scored = outcomes(session).filter((line) => line.status === 'scored' && line.phase === 'before');
      shares.push(scored.filter((line) => line.codes?.[0] === 'on').length / scored.length);
    }
    const chosen = classroom.children.flatMap((child, i) =>
      classroom.draw?.chosen.includes(child.id) ? [placeOf(i)] : [],
    );
    const e = errorOf('Quill', 0);
    const trueMean = chosen.reduce((sum, place) => sum + shareOf(truth, place, 'before'), 0) / chosen.length;
    const expected = trueMean * (1 - e) + (1 - trueMean) * e;
    const mean = shares.reduce((sum, s) => sum + s, 0) / shares.length;
    const spread = Math.sqrt(shares.reduce((sum, s) => sum + (s - mean) ** 2, 0) / (shares.length - 1));
    expect(Math.abs(mean - expected)).toBeLessThan((4 * spread) / Math.sqrt(shares.length));
  });
});
