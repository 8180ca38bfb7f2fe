import { gzipSync } from 'fflate';
import { expect, test } from 'vitest';
import { checksumOf } from '../../src/exchange/checksumOf.ts';
import { migrate } from '../../src/exchange/migrations.ts';
import { readIncoming } from '../../src/exchange/readIncoming.ts';
import { writeStudyFile } from '../../src/exchange/writeStudyFile.ts';
import { writeVisitFile } from '../../src/exchange/writeVisitFile.ts';
import { bytesOf, journalOf, jsonOf, laidHeader, sampleBundle, visitPlan, writing } from './sampleStudy.ts';
import { sentence } from './sentence.ts';

const read = (bytes: Uint8Array) => readIncoming({ name: 'a.json', bytes });

type Loose = Record<string, unknown>;
interface LooseFile {
  study: Loose;
  classes: [Loose];
  sessions: [LooseSession, ...LooseSession[]];
}
interface LooseSession {
  header: { observer: { id?: string }; schedule: { protocol: Loose; phases: string[] } };
  journal: [Loose, Loose, ...Loose[]];
}

/** The sample file with something changed and the checksum made right again. */
async function changed(change: (file: LooseFile) => void): Promise<Uint8Array> {
  const file = jsonOf(await writeStudyFile(sampleBundle(), writing));
  change(file as unknown as LooseFile);
  return bytesOf({ ...file, checksum: await checksumOf(file) });
}

test('a study file gives back what was written, plain and compressed', async () => {
  const bundle = { ...sampleBundle(), visitPlans: [visitPlan] };
  for (const compress of [false, true]) {
    const bytes = await writeStudyFile(bundle, { ...writing, compress });
    expect(await read(bytes)).toEqual({ ok: true, file: 'a.json', form: 'study', bundle, notices: [] });
  }
});

test('the envelope has the members of the published form and no others', async () => {
  const file = jsonOf(await writeStudyFile(sampleBundle(), writing));
  expect(Object.keys(file)).toEqual([
    'format',
    'version',
    'exportedAt',
    'app',
    'study',
    'classes',
    'observers',
    'protocols',
    'sessions',
    'checksum',
  ]);
  expect(file).toMatchObject({ format: 'lookbell-study', version: 1, app: '0.1.0' });
  expect(file.checksum).toMatch(/^[0-9a-f]{64}$/);
});

test('the checksum is SHA-256 over canonical JSON: the order of members does not matter', async () => {
  // SHA-256 of the text {"a":1,"b":[true,null]}, by `printf '%s' '{"a":1,"b":[true,null]}' | sha256sum`.
  const expected = '1cc69c7fa23616ca2ec3ee70d24390a6225c8832db8a4c814c7e0e7f942f8668';
  expect(await checksumOf({ b: [true, null], a: 1, checksum: 'whatever' })).toBe(expected);
});

test('the same bundle gives the same bytes, also compressed', async () => {
  const once = await writeStudyFile(sampleBundle(), { ...writing, compress: true });
  expect(await writeStudyFile(sampleBundle(), { ...writing, compress: true })).toEqual(once);
});

test('a visit file carries its plan and nothing else', async () => {
  const bytes = await writeVisitFile(visitPlan, writing);
  expect(Object.keys(jsonOf(bytes))).toEqual(['format', 'version', 'exportedAt', 'app', 'visit', 'checksum']);
  const outcome = await read(bytes);
  expect(outcome).toMatchObject({
    ok: true,
    form: 'visit',
    bundle: { visitPlans: [visitPlan], sessions: [] },
  });
});

test('a checksum that does not match is told, with what can still be read', async () => {
  const file = jsonOf(await writeStudyFile(sampleBundle(), writing));
  const outcome = await read(bytesOf({ ...file, app: '0.1.1' }));
  expect(outcome).toMatchObject({ ok: true, bundle: sampleBundle() });
  expect(outcome.ok && outcome.notices.map(sentence)).toEqual([
    'The checksum does not match: the file was changed or damaged after it was written. What can still be read: 1 class, 1 session with 5 entries.',
  ]);
});

test('every member of the envelope is needed, and its absence is told with its path', async () => {
  const file = jsonOf(await writeStudyFile(sampleBundle(), writing));
  for (const member of Object.keys(file)) {
    const outcome = await read(bytesOf({ ...file, [member]: undefined }));
    expect(outcome.ok, member).toBe(false);
    expect(!outcome.ok && outcome.problems.map(({ path }) => path)).toEqual([`$.${member}`]);
  }
});

test('a needed member of a header or an entry is told with its path', async () => {
  const header = await read(await changed((file) => delete file.sessions[0].header.observer.id));
  expect(!header.ok && header.problems.map(sentence)).toEqual([
    '$.sessions[0].header.observer.id is absent; expected a text.',
  ]);
  const entry = await read(await changed((file) => delete file.sessions[0].journal[1].interval));
  expect(!entry.ok && entry.problems.map(sentence)).toEqual([
    '$.sessions[0].journal[1].interval is absent; expected a number.',
  ]);
});

test('entries and members that a newer program added are kept and passed on', async () => {
  const bytes = await changed((file) => {
    file.sessions[0].journal.push(
      ...journalOf('session-1', 'writer-2', [{ kind: 'hummed', at: 80_000, tune: { bars: 4 } }]),
    );
    file.sessions[0].journal[1].pressure = 0.7;
    file.study.colour = 'green';
  });
  const outcome = await read(bytes);
  if (!outcome.ok) throw new Error(outcome.problems.map(sentence).join());
  expect(outcome.notices.map(sentence)).toEqual([
    '1 entry is of a kind that only a newer Lookbell knows (hummed); they are kept and passed on.',
  ]);
  const again = jsonOf(await writeStudyFile(outcome.bundle, writing)) as unknown as LooseFile;
  expect(again.sessions[0].journal.at(-1)).toMatchObject({ kind: 'hummed', tune: { bars: 4 } });
  expect(again.sessions[0].journal[1].pressure).toBe(0.7);
  expect(again.study.colour).toBe('green');
});

test('absent entries and identities with two contents are told, and what is there is read', async () => {
  const outcome = await read(
    await changed((file) => {
      const { journal } = file.sessions[0];
      journal.splice(2, 1);
      journal.push({ ...journal[1], code: 'off' });
    }),
  );
  expect(outcome.ok && outcome.notices.map(sentence)).toEqual([
    '$.sessions[0].journal[4]: entry number 1 of its writer stands here with two contents; both are kept, to be looked at.',
    '$.sessions[0].journal: 1 entry of a writer is absent, the first with number 2; what is there is read.',
  ]);
});

test('references that lead nowhere are refused', async () => {
  const cases: [(file: LooseFile) => void, string][] = [
    [
      (file) => {
        file.sessions[0].journal[1].code = 'asleep';
      },
      '$.sessions[0].journal[1].code',
    ],
    [
      (file) => {
        file.sessions[0].journal[1].interval = 9;
      },
      '$.sessions[0].journal[1].interval',
    ],
    [
      (file) => {
        file.sessions[0].journal[1].session = 'session-2';
      },
      '$.sessions[0].journal[1].session',
    ],
    [
      (file) => {
        file.sessions.push(file.sessions[0]);
      },
      '$.sessions[1]',
    ],
    [
      (file) => {
        file.classes[0].study = 'study-2';
      },
      '$.classes[0].study',
    ],
  ];
  for (const [change, path] of cases) {
    const outcome = await read(await changed(change));
    expect(!outcome.ok && outcome.problems.map((problem) => problem.path)).toEqual([path]);
  }
});

test('an absurd schedule is counted, not laid out', async () => {
  const bytes = await changed((file) => {
    const { schedule } = file.sessions[0].header;
    schedule.protocol.partLength = { kind: 'rounds', rounds: 1000 };
    schedule.protocol.rotation = { kind: 'block', intervals: 240 };
    schedule.phases = Array.from({ length: 1000 }, (_, i) => `phase ${i}`);
  });
  expect((await read(bytes)).ok).toBe(true);
});

test('migrations take an old envelope through every step, and say the new version in it', () => {
  const steps = {
    1: (envelope: object) => ({ ...envelope, one: true }),
    2: (envelope: object) => ({ ...envelope, two: 'one' in envelope }),
  };
  expect(migrate({ version: 1 }, 1, 3, steps)).toEqual({ version: 3, one: true, two: true });
  expect(migrate({ version: 3 }, 3, 3, steps)).toEqual({ version: 3 });
});

test('a compressed file that is cut off, or lies about its length, is refused in words', async () => {
  const whole = gzipSync(await writeStudyFile(sampleBundle(), writing));
  for (const bytes of [whole.slice(0, 200), whole.slice(0, 12), lying(whole)]) {
    const outcome = await read(bytes);
    expect(!outcome.ok && outcome.problems.map(({ problem }) => problem.code)).toEqual([
      'file.cutOffCompressed',
    ]);
  }
});

function lying(whole: Uint8Array): Uint8Array {
  const bytes = whole.slice();
  new DataView(bytes.buffer).setUint32(bytes.length - 4, 3_000_000, true);
  return bytes;
}

test('a listed header of another session in the same file does not disturb', async () => {
  const bundle = sampleBundle();
  bundle.sessions.push({ header: laidHeader('session-2', 'Marsh'), journal: [] });
  expect(await read(await writeStudyFile(bundle, writing))).toMatchObject({ ok: true, notices: [] });
});
