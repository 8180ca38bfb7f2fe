import { base32Digits, base32Letters, base32Of } from './base32.ts';

/** Characters in a line, without its check. */
const lineLength = 30;
const modulus = 1021;
const radix = 37;

/**
 * Base32 in lines for people who type it: thirty characters, a colon, two that check them, a colon, a line break. A
 * text that is broken elsewhere, or nowhere, reads as well: only the colons count.
 */
export function toCardLines(text: string): string {
  const lines = text.match(new RegExp(`.{1,${lineLength}}`, 'g')) ?? [];
  return lines.map((line, i) => `${line}:${checkOf(line, i)}:\n`).join('');
}

export type CardLines =
  | { readonly ok: true; readonly text: string }
  /** The first line that is not as it was written, from 1. */
  | { readonly ok: false; readonly line: number; readonly found: string };

/** Takes the checks off again. A text without colons has none, and is as it is. */
export function fromCardLines(written: string): CardLines {
  if (!written.includes(':')) return { ok: true, text: written };
  const tokens = written.replace(/:$/, '').split(':');
  let text = '';
  for (let at = 0; at < tokens.length; at += 2) {
    const [line = '', check = ''] = tokens.slice(at, at + 2).map(base32Letters);
    if (line === '' || checkOf(line, at / 2) !== check) return { ok: false, line: at / 2 + 1, found: line };
    text += line;
  }
  return { ok: true, text };
}

/**
 * Two characters for a line and its place. The modulus is a prime larger than any difference of two characters, so that
 * one wrong character always shows, and so do two neighbours that changed places; a line that is absent shows in the
 * next one.
 */
function checkOf(line: string, place: number): string {
  const sum = base32Digits(line).reduce(
    (held, digit) => (held * radix + digit) % modulus,
    (place + 1) % modulus,
  );
  return base32Of([Math.floor(sum / 32), sum % 32]);
}
