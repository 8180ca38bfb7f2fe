import type { KnownEntry } from '../journal/entry.ts';
import { recordingFacts } from '../journal/headerFacts.ts';
import { isKnown } from '../journal/known.ts';
import type { StoredSession } from '../journal/stored.ts';
import type { SessionHeader } from '../model/session.ts';
import { intervalsInPart } from '../schedule/layOut.ts';
import { checkJournal } from './checkJournal.ts';
import type { Refusal } from './openEnvelope.ts';
import { excerpt, type Fault, fault } from './problemValues.ts';
import type { Bundle } from './types.ts';

type Checked = { ok: true; notices: { path: string | null; fault: Fault }[] } | Refusal;

const refuse = (path: string, found: Fault): Refusal => ({ ok: false, path, fault: found });

/** What a schema cannot see: one identity twice, references that lead nowhere, entries that are absent. */
export function checkStudy(bundle: Bundle): Checked {
  const { study, classes, observers, protocols, sessions, visitPlans } = bundle;
  const lists = [
    { name: 'classes', ids: classes.map(({ id }) => id) },
    { name: 'observers', ids: observers.map(({ id }) => id) },
    { name: 'protocols', ids: protocols.map(({ id, version }) => `${id} ${version}`) },
    { name: 'sessions', ids: sessions.map(({ header }) => header.id) },
    { name: 'visitPlans', ids: visitPlans.map(({ visit }) => visit) },
  ];
  for (const { name, ids } of lists) {
    const seen = new Set<string>();
    for (const [i, id] of ids.entries()) {
      if (seen.has(id)) {
        const path = `$.${name}[${i}]`;
        return refuse(path, fault('study.twice', { path, id: excerpt(id) }));
      }
      seen.add(id);
    }
  }
  if (study !== null) {
    const owned = [
      ...classes.map((record, i) => ({ path: `$.classes[${i}].study`, found: record.study })),
      ...observers.map((record, i) => ({ path: `$.observers[${i}].study`, found: record.study })),
      ...protocols.map((record, i) => ({ path: `$.protocols[${i}].study`, found: record.study })),
      ...sessions.map(({ header }, i) => ({ path: `$.sessions[${i}].header.study`, found: header.study })),
    ];
    const stray = owned.find(({ found }) => found !== study.id);
    if (stray !== undefined) {
      const values = { path: stray.path, found: excerpt(stray.found), expected: study.id };
      return refuse(stray.path, fault('study.otherStudy', values));
    }
  }
  const notices: { path: string | null; fault: Fault }[] = [];
  for (const [i, session] of sessions.entries()) {
    const bad = checkReferences(session, `$.sessions[${i}]`);
    if (bad !== null) return bad;
    notices.push(...checkJournal(session.journal, `$.sessions[${i}].journal`));
  }
  return { ok: true, notices };
}

/** Entries belong to their session, and speak of intervals and codes that it has. */
function checkReferences({ header, journal }: StoredSession, path: string): Refusal | null {
  const { most, has } = intervalNumbers(header);
  const { codes } = recordingFacts(header).codeSet;
  const ids = new Set(codes.map(({ id }) => id));
  for (const [e, entry] of journal.entries()) {
    const at = `${path}.journal[${e}]`;
    if (entry.session !== header.id) {
      const values = { path: `${at}.session`, found: excerpt(entry.session), expected: header.id };
      return refuse(`${at}.session`, fault('study.otherSession', values));
    }
    if (!isKnown(entry)) continue;
    for (const { member, interval } of intervalsOf(entry)) {
      if (has(interval)) continue;
      const values = { path: `${at}.${member}`, interval, most };
      return refuse(`${at}.${member}`, fault('study.noInterval', values));
    }
    for (const { member, code } of codesOf(entry)) {
      if (ids.has(code)) continue;
      const expected = excerpt([...ids].join(', '));
      const values = { path: `${at}.${member}`, code: excerpt(code), codes: expected };
      return refuse(`${at}.${member}`, fault('study.noCode', values));
    }
  }
  return null;
}

function intervalsOf(entry: KnownEntry): { member: string; interval: number }[] {
  if (entry.kind === 'swapped')
    return entry.pairs.flatMap((pair, i) =>
      pair.map((interval, k) => ({ member: `pairs[${i}][${k}]`, interval })),
    );
  if (!('interval' in entry) || entry.interval === null) return [];
  return [{ member: 'interval', interval: entry.interval }];
}

function codesOf(entry: KnownEntry): { member: string; code: string }[] {
  if (entry.kind === 'marked') return entry.code === null ? [] : [{ member: 'code', code: entry.code }];
  if (entry.kind === 'settled' || entry.kind === 'amended' || entry.kind === 'corrected')
    return (entry.codes ?? []).map((code, i) => ({ member: `codes[${i}]`, code }));
  return [];
}

/** Which interval numbers a session has. A laid schedule is counted, not laid out: a damaged one might be endless. */
function intervalNumbers(header: SessionHeader): { most: number; has: (interval: number) => boolean } {
  const { schedule, children } = header;
  if (schedule.kind === 'listed') {
    const numbers = new Set(schedule.intervals.map(({ number }) => number));
    const most = schedule.intervals.reduce((largest, { number }) => Math.max(largest, number), 0);
    return { most, has: (interval) => numbers.has(interval) };
  }
  const { protocol, phases } = schedule;
  const perPart = intervalsInPart(protocol.partLength, protocol, children.length);
  const nobody = children.length === 0 && protocol.method !== 'headcount';
  const most = nobody ? 0 : phases.length * perPart;
  return { most, has: (interval) => interval <= most };
}
