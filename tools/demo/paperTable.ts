import { readOut } from '../../src/journal/readOut.ts';
import { fold } from '../../src/journal/step.ts';
import type { StoredSession } from '../../src/journal/stored.ts';
import { protocol } from './school.ts';

/** A session as somebody would type it from paper: names instead of identifiers, and only what paper holds. */
export function paperTable({ header, journal }: StoredSession): string {
  const nameOf = new Map(header.children.map((child) => [child.id, child.pseudonym]));
  const labelOf = new Map(protocol.codeSet.codes.map((code) => [code.id, code.label]));
  const rows = readOut(fold(header, journal)).map((line) => ({
    session: `${header.classroom.name} on paper`,
    observer: header.observer.name,
    child: nameOf.get(line.child ?? ''),
    interval: line.number,
    code: line.codes?.map((code) => labelOf.get(code)).join('|') ?? '',
    missing: line.missing ?? '',
    class: header.classroom.name,
    condition: header.condition,
    phase: line.phase,
    date: header.date,
    start: header.plannedStart,
    round: line.round,
    interval_s: protocol.intervalMs / 1000,
    lesson_part: line.lessonPart ?? '',
  }));
  const [first] = rows;
  if (first === undefined) return '';
  const lines = [Object.keys(first), ...rows.map((row) => Object.values(row))];
  return lines.map((cells) => `${cells.map((cell) => quoted(String(cell ?? ''))).join(',')}\r\n`).join('');
}

/** A cell of a table as RFC 4180 writes it. */
function quoted(text: string): string {
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
