import { decodeText } from './decodeText.ts';
import { openEnvelope } from './openEnvelope.ts';
import { parseJson } from './parseJson.ts';
import { type Fault, fault, problemAt } from './problemValues.ts';
import { readStudyEnvelope } from './readStudyEnvelope.ts';
import { readTable } from './readTable.ts';
import { readVisitEnvelope } from './readVisitEnvelope.ts';
import type { IncomingFile, ReadOptions, ReadOutcome } from './types.ts';
import { unpackBytes } from './unpackBytes.ts';

/**
 * Reads a file of any of our forms; which one it is, its content says. A file with a problem contributes
 * nothing and is told with the first thing that is wrong. Never throws on content.
 */
export async function readIncoming(file: IncomingFile, options: ReadOptions = {}): Promise<ReadOutcome> {
  const { name } = file;
  const refuse = (found: Fault, where: { line?: number; path?: string } = {}): ReadOutcome => ({
    ok: false,
    file: name,
    problems: [problemAt(name, where, found)],
  });
  const unpacked = unpackBytes(file.bytes);
  if (!unpacked.ok) return refuse(unpacked.fault);
  const decoded = decodeText(unpacked.bytes);
  if (!decoded.ok) return refuse(decoded.fault, decoded.line === null ? {} : { line: decoded.line });
  const { text } = decoded;
  const beginning = text.trimStart().slice(0, 20);
  if (/^<(!|\?|[a-z])/i.test(beginning)) return refuse(fault('file.html', {}), { line: 1 });
  if (/^[{[]/.test(beginning)) {
    const parsed = parseJson(text);
    if (!parsed.ok) return refuse(parsed.fault, parsed);
    const opened = await openEnvelope(parsed.value);
    if (!opened.ok) return refuse(opened.fault, opened);
    const { form, envelope, intact } = opened;
    const read = form === 'study' ? readStudyEnvelope(envelope, intact) : readVisitEnvelope(envelope, intact);
    if (!read.ok) return refuse(read.fault, read);
    const notices = read.notices.map(({ path, fault: found }) =>
      problemAt(name, path === null ? {} : { path }, found),
    );
    return { ok: true, file: name, form, bundle: read.bundle, notices };
  }
  const table = readTable(text, options);
  if (!table.ok) {
    const problems = [problemAt(name, { line: table.stop.line }, table.stop.fault)];
    return { ok: false, file: name, problems, ...(table.askRoles ? { askRoles: table.askRoles } : {}) };
  }
  const notices = table.notices.map((notice) => problemAt(name, { line: notice.line }, notice.fault));
  return { ok: true, file: name, form: 'table', bundle: table.bundle, notices };
}
