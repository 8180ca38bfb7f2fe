import { ok, type Result } from '../kernel/result.ts';
import { fromBase32, toBase32 } from './base32.ts';
import { fromCardLines, toCardLines } from './cardLines.ts';
import { cardProblem } from './cardProblems.ts';
import { excerpt } from './problemValues.ts';

/** The version of the form of cards that this program writes, and the highest that it reads. */
export const cardVersion = 1;

/** Bytes in one picture: with its head it fills a QR code of version 18 (89 modules a side) at correction level M. */
export const partBytes = 495;
/** More pictures than these are not shown in turn: the visit file is the better way then. */
export const mostParts = 60;

/** What was read of one card so far. */
export interface CardParts {
  /** The first 40 bits of the checksum of its content, in Base32. */
  readonly card: string;
  readonly of: number;
  /** By number, from 1. */
  readonly parts: ReadonlyMap<number, Uint8Array>;
}

/** Which parts are still to be read. */
export function missingParts({ of, parts }: CardParts): number[] {
  return Array.from({ length: of }, (_, i) => i + 1).filter((number) => !parts.has(number));
}

/**
 * One part as text: `LB`, version, card, number, how many, content; a point after each. All of it is in the
 * alphanumeric mode of QR.
 */
export function writePart(card: string, number: number, of: number, content: Uint8Array): string {
  return `LB${cardVersion}.${card}.${number}.${of}.${toBase32(content)}.`;
}

/** All of a card in one text, in lines that somebody could type. */
export function writeText(card: string, content: Uint8Array): string {
  return `LB${cardVersion}.${card}.1.1.\n${toCardLines(toBase32(content))}.`;
}

/** The content in as many parts as it needs, as equal as can be. */
export function splitContent(content: Uint8Array, most = partBytes): Uint8Array[] {
  const count = Math.max(1, Math.ceil(content.length / most));
  // Whole groups of Base32, so that no character is half empty.
  const each = Math.ceil(content.length / count / 5) * 5;
  return Array.from({ length: count }, (_, i) => content.slice(i * each, (i + 1) * each));
}

const head = /LB(\d{1,4})\.([^.]*)\.(\d{1,4})\.(\d{1,4})\.([^.]*)(\.?)/g;

/**
 * Adds what stands in a text (of a picture, or typed, or pasted: one part or several, whatever stands around them) to
 * what was read of a card. White space, hyphens, and lower case do no harm, parts come in any order and may come again.
 * A text with anything wrong adds nothing.
 */
export function addParts(have: CardParts | null, text: string): Result<CardParts> {
  const plain = text
    .toUpperCase()
    .replace(/[\s\u00ad\u200b-\u200d\u2010-\u2013\u2060\ufeff-]+/g, '')
    .replaceAll('\u2026', '...');
  const found = [...plain.matchAll(head)];
  if (found.length === 0)
    return /^LB\d/.test(plain)
      ? cardProblem('card.cutOff', {})
      : cardProblem('card.otherCode', { found: excerpt(text.trim()) });
  let result = have;
  for (const [, version, card, number, of, content, end] of found) {
    if (Number(version) > cardVersion)
      return cardProblem('card.newer', { version: Number(version), known: cardVersion });
    if (end === '') return cardProblem('card.cutOff', {});
    const added = add(result, card ?? '', Number(number), Number(of), content ?? '');
    if (!added.ok) return added;
    result = added.value;
  }
  return result === null ? cardProblem('card.damaged', {}) : ok(result);
}

function add(
  have: CardParts | null,
  written: string,
  number: number,
  of: number,
  content: string,
): Result<CardParts> {
  const lines = fromCardLines(content);
  if (!lines.ok) return cardProblem('card.line', { line: lines.line, found: excerpt(lines.found) });
  const card = fromBase32(written);
  const bytes = fromBase32(lines.text);
  if (card?.length !== 5 || bytes === null || bytes.length === 0) return cardProblem('card.damaged', {});
  if (number < 1 || of < 1 || number > of || of > mostParts) return cardProblem('card.damaged', {});
  const name = toBase32(card);
  if (have !== null && have.card !== name) return cardProblem('card.otherCard', {});
  // The copied text of a card is its one part: it says all that the pictures say.
  if (have !== null && have.of !== of && of !== 1 && have.of !== 1) return cardProblem('card.damaged', {});
  if (have === null || (of === 1 && have.of !== 1))
    return ok({ card: name, of, parts: new Map([[number, bytes]]) });
  if (have.of === 1 && of !== 1) return ok(have);
  const known = have.parts.get(number);
  if (known === undefined) return ok({ ...have, parts: new Map(have.parts).set(number, bytes) });
  return same(known, bytes) ? ok(have) : cardProblem('card.damaged', {});
}

const same = (a: Uint8Array, b: Uint8Array): boolean =>
  a.length === b.length && a.every((byte, i) => byte === b[i]);
