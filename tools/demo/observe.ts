import type { EntryBody, JournalEntry } from '../../src/journal/entry.ts';
import type { StoredSession } from '../../src/journal/stored.ts';
import { idFromContent } from '../../src/kernel/idFromContent.ts';
import { type Random, seededRandom, shuffled } from '../../src/kernel/random.ts';
import { epochMs } from '../../src/kernel/units.ts';
import { epochOf, toWallTime } from '../../src/kernel/wallTime.ts';
import type { Classroom } from '../../src/model/classroom.ts';
import type { Role, SessionHeader } from '../../src/model/session.ts';
import { layOut } from '../../src/schedule/layOut.ts';
import { type Bout, simulateLesson } from '../../src/stats/simulateLesson.ts';
import { observers, protocol, study } from './school.ts';
import { boutsOf, type ClassTruth, errorOf, shareOf, withOthers } from './truth.ts';

/** What happened at one visit, for everybody who watched it. */
export interface Lesson {
  readonly truth: ClassTruth;
  readonly classroom: Classroom;
  readonly number: number;
  /** Local start, without offset, for example `2026-11-03T09:30:00`. */
  readonly start: string;
  readonly fireDrill: boolean;
  /** A child who is taken out by another adult for some minutes. */
  readonly childLeaves: boolean;
}

const partMs = 15 * 60_000;
const breakMs = 10 * 60_000;

/** The true behaviour of each target child in each phase: bouts of being on-task. */
export function behaviour(lesson: Lesson): Map<string, Record<'before' | 'after', Bout[]>> {
  const random = seededRandom(`demo behaviour ${lesson.truth.name} ${lesson.number}`);
  const chosen = lesson.classroom.draw?.chosen ?? [];
  const places = new Map(lesson.classroom.children.map((child, i) => [child.id, placeOf(i)]));
  return new Map(
    chosen.map((child) => {
      const live = (phase: 'before' | 'after') =>
        simulateLesson({
          ...boutsOf(shareOf(lesson.truth, places.get(child) ?? 0, phase)),
          seconds: partMs / 1000 + 30,
          random,
        });
      return [child, { before: live('before'), after: live('after') }];
    }),
  );
}

/** Where the i-th of twelve children lies in its class, −1 … 1; the two strata are alike. */
export function placeOf(i: number): number {
  return (Math.floor(i / 2) - 2.5) / 2.5;
}

interface Watching {
  readonly observer: 'Quill' | 'Marsh';
  readonly role: Role | null;
  readonly visitsSoFar: number;
  /** This tablet began so much later. */
  readonly lateMs: number;
}

/** One observer's session of a lesson: header and journal as the recorder would have written them. */
export function observe(lesson: Lesson, watching: Watching): StoredSession {
  const key = `${lesson.truth.name} ${lesson.number}`;
  const random = seededRandom(`demo observer ${key} ${watching.observer}`);
  const header = headerOf(lesson, watching, key);
  const lines = layOut(
    protocol,
    study.phases,
    header.children.map((child) => child.id),
  );
  const lives = behaviour(lesson);
  const afterOrigin = partMs + 15_000 + breakMs;
  const said: [number, EntryBody][] = [[0, { kind: 'started', checks: [], anyway: false }]];
  const drill = lesson.fireDrill ? ([5 * 60_000, 9 * 60_000] as const) : null;
  const away = lesson.childLeaves ? ([6 * 60_000, 11 * 60_000] as const) : null;
  const leaver = header.children[2]?.id ?? '';
  if (drill) said.push([drill[0], { kind: 'interrupted' }], [drill[1], { kind: 'continued' }]);
  if (away)
    said.push(
      [away[0], { kind: 'left', child: leaver, reason: 'with another adult' }],
      [away[1], { kind: 'returned', child: leaver }],
    );
  for (const origin of [0, afterOrigin]) {
    said.push([origin + 1000, { kind: 'lessonPart', lessonPart: study.lessonParts[0] ?? null }]);
    said.push([origin + 6 * 60_000 + 500, { kind: 'lessonPart', lessonPart: study.lessonParts[2] ?? null }]);
  }
  said.push([partMs + 14_500, { kind: 'breakStarted' }], [afterOrigin - 40_000, { kind: 'breakEnded' }]);
  said.push([afterOrigin, { kind: 'phaseStarted', phase: 'after', part: 1, origin: afterOrigin }]);
  for (const line of lines) {
    const at = (line.part === 0 ? 0 : afterOrigin) + line.cueMs;
    const quiet = drill !== null && at >= drill[0] && at < drill[1];
    const gone = away !== null && line.child === leaver && at >= away[0] && at < away[1];
    said.push([
      at,
      {
        kind: 'cued',
        interval: line.number,
        cue: 'look',
        planned: at,
        delivered: quiet ? null : at,
        by: quiet ? [] : ['sound', 'screen'],
      },
    ]);
    if (quiet || gone) continue;
    const touched = at + 700 + Math.floor(2600 * random() ** 2);
    const chance = random();
    if (chance < 0.012) continue;
    if (chance < 0.03) {
      said.push([touched, { kind: 'missing', interval: line.number, reason: 'out of view' }]);
      continue;
    }
    const life = lives.get(line.child ?? '')?.[line.phase === 'before' ? 'before' : 'after'] ?? [];
    said.push([
      touched,
      {
        kind: 'marked',
        interval: line.number,
        code: codeSeen(life, line.cueMs / 1000, lesson, line.number, watching, random),
      },
    ]);
  }
  const end = afterOrigin + (lines.at(-1)?.closeMs ?? 0);
  said.push([end, { kind: 'ended', reason: 'complete' }]);
  return { header, journal: written(header, said, watching.lateMs, random) };
}

/** What the observer marks: the truth, or by mistake the other thing. Both observers see the same truth. */
function codeSeen(
  life: readonly Bout[],
  second: number,
  lesson: Lesson,
  number: number,
  watching: Watching,
  random: Random,
): string {
  const on = life.some((bout) => second > bout.on && second <= bout.off);
  const together =
    seededRandom(`demo together ${lesson.truth.name} ${lesson.number} ${number}`)() < withOthers;
  const off = together ? 'off-others' : 'off-alone';
  const wrong = random() < errorOf(watching.observer, watching.visitsSoFar);
  if (!wrong) return on ? 'on' : off;
  // Marsh, where she errs, errs towards on-task: she drifts to a laxer definition.
  if (watching.observer === 'Marsh') return on && random() < 0.6 ? 'on' : on ? off : 'on';
  return on ? off : 'on';
}

function headerOf(lesson: Lesson, watching: Watching, key: string): SessionHeader {
  const { classroom } = lesson;
  const observer = observers.find((o) => o.name === watching.observer);
  if (observer === undefined || classroom.draw === null)
    throw new Error(`The demo has no observer ${watching.observer}.`);
  const orderSeed = `demo order ${key}`;
  const order = shuffled(classroom.draw.chosen, seededRandom(orderSeed));
  return {
    id: idFromContent('demo', 'session', key, watching.observer),
    study: study.id,
    classroom: { id: classroom.id, name: classroom.name },
    condition: classroom.condition,
    visit: idFromContent('demo', 'visit', key),
    visitLabel: null,
    observer: { id: observer.id, name: observer.name },
    role: watching.role,
    practice: false,
    date: lesson.start.slice(0, 10),
    plannedStart: `${lesson.start}.000+00:00`,
    children: order.map((id) => {
      const child = classroom.children.find((c) => c.id === id);
      return { id, pseudonym: child?.pseudonym ?? id, stratum: child?.stratum ?? null };
    }),
    plan: classroom.plan,
    draw: classroom.draw,
    orderSeed,
    schedule: { kind: 'laid', protocol, phases: study.phases },
    app: 'demo',
    device: 'demo',
    timeZone: 'Europe/London',
  };
}

function written(
  header: SessionHeader,
  said: readonly (readonly [number, EntryBody])[],
  lateMs: number,
  random: Random,
): JournalEntry[] {
  const writer = idFromContent('demo', 'writer', header.id);
  const begin = epochOf(header.plannedStart ?? '') + lateMs + Math.floor(random() * 40);
  return said
    .map((entry, i) => ({ entry, i }))
    .sort((a, b) => a.entry[0] - b.entry[0] || a.i - b.i)
    .map(({ entry: [at, body] }, seq) => ({
      session: header.id,
      writer,
      seq,
      at,
      wall: toWallTime(epochMs(begin + at), 0),
      ...body,
    }));
}
