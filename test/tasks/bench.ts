import { seededRandom } from '../../src/kernel/random.ts';
import { epochMs } from '../../src/kernel/units.ts';
import { toWallTime } from '../../src/kernel/wallTime.ts';
import type { Classroom } from '../../src/model/classroom.ts';
import type { Protocol } from '../../src/model/protocol.ts';
import type { SessionHeader } from '../../src/model/session.ts';
import type { Study } from '../../src/model/study.ts';
import {
  addChild,
  addClass,
  addObserver,
  createStudy,
  type Deps,
  drawTargets,
  type NewStudyTexts,
  type PreparedVisit,
  prepareVisit,
  startSession,
} from '../../src/tasks/index.ts';
import { openedMemory } from '../storage/opened.ts';
import { given, journalOf } from '../storage/samples.ts';

const words = { label: 'x', definition: '', examples: '', nonExamples: '' };
export const texts: NewStudyTexts = {
  phases: ['before', 'after'],
  conditions: ['break', 'usual'],
  control: 'usual',
  lessonParts: ['whole class', 'group'],
  codeSets: {
    onOff: 'On / off',
    aloneOrWithOthers: 'Alone or with others',
    onTask: { ...words, label: 'on-task' },
    offTask: { ...words, label: 'off-task' },
    offTaskAlone: { ...words, label: 'off-task, by oneself' },
    offTaskWithOthers: { ...words, label: 'off-task, with others' },
  },
  protocolMomentary: 'Next child, every 15 seconds',
  protocolPartial: 'One after another',
};

export interface Bench {
  readonly deps: Deps;
  readonly dump: () => Promise<string>;
}

/** A tablet of its own, with a clock that moves a second with each look. */
export async function bench(writer = 'tablet-a', seed = writer): Promise<Bench> {
  const { store, dump } = await openedMemory();
  let now = Date.UTC(2026, 10, 3, 9);
  const wall = () => {
    now += 1000;
    return toWallTime(epochMs(now), 0);
  };
  const deps: Deps = {
    store,
    clock: { wall },
    random: seededRandom(seed),
    writer,
    app: '0.1.0',
    device: 'test tablet',
    timeZone: 'Europe/London',
  };
  return { deps, dump };
}

export interface School {
  readonly study: Study;
  readonly classroom: Classroom;
  readonly protocol: Protocol;
  readonly observer: string;
}

/** A study with one class of `children` children, one observer, and targets drawn for the first protocol. */
export async function school({ deps }: Bench, children = 10): Promise<School> {
  const study = given(await createStudy(deps, { name: 'Hedge school', texts }));
  let classroom = given(await addClass(deps, study.id, { name: 'Class Otter', condition: 'break' }));
  for (let i = 1; i <= children; i++) {
    const pseudonym = `Otter-${String(i).padStart(2, '0')}`;
    classroom = given(
      await addChild(deps, classroom.id, { pseudonym, stratum: i % 2 ? 'a' : 'b', consent: true }),
    );
  }
  const observer = given(await addObserver(deps, study.id, 'Quill'));
  const protocol = given(await deps.store.protocols(study.id)).find(
    (one) => one.method === 'momentary',
  ) as Protocol;
  classroom = given(await drawTargets(deps, classroom.id, protocol, 'seed one'));
  return { study, classroom, protocol, observer: observer.id };
}

export async function visitOf({ deps }: Bench, made: School): Promise<PreparedVisit> {
  return given(
    await prepareVisit(deps, {
      classroom: made.classroom.id,
      protocol: { id: made.protocol.id },
      phases: ['before'],
      absent: [],
      plannedStart: null,
    }),
  );
}

/** A session for the record with some marks; ended unless told otherwise. */
export async function recorded(
  on: Bench,
  made: School,
  { ended = true, marks = 3, practice = false } = {},
): Promise<SessionHeader> {
  const { plan } = await visitOf(on, made);
  const header = given(
    await startSession(on.deps, plan, { observer: made.observer, role: 'primary', practice }),
  );
  given(await on.deps.store.appendEntries(header.id, journalOf(header.id, marks, ended)));
  return header;
}
