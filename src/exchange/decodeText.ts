import { type Fault, fault } from './problemValues.ts';

export type Decoded =
  | { readonly ok: true; readonly text: string }
  | { readonly ok: false; readonly fault: Fault; readonly line: number | null };

/** UTF-8 bytes as text, a byte order mark taken off; says in which line the first bad byte or NUL stands. */
export function decodeText(bytes: Uint8Array): Decoded {
  const [first, second] = bytes;
  if ((first === 0xff && second === 0xfe) || (first === 0xfe && second === 0xff))
    return { ok: false, fault: fault('file.utf16', {}), line: null };
  let text: string;
  try {
    text = new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return { ok: false, fault: fault('file.notUtf8', {}), line: badLine(bytes) };
  }
  const nul = text.indexOf('\u0000');
  if (nul >= 0) return { ok: false, fault: fault('file.nul', {}), line: lineAt(text, nul) };
  if (text.trim() === '') return { ok: false, fault: fault('file.empty', {}), line: null };
  return { ok: true, text };
}

/** The physical line (from 1) on which a character stands; CR LF, LF and CR alone each end a line. */
export function lineAt(text: string, offset: number): number {
  return 1 + lineBreaks(text, 0, offset);
}

/** How many lines end between two places of a text. */
export function lineBreaks(text: string, from: number, to: number): number {
  let n = 0;
  for (let i = from; i < to; i++) {
    const c = text.charCodeAt(i);
    if (c === 10 || (c === 13 && text.charCodeAt(i + 1) !== 10)) n++;
  }
  return n;
}

/** A line feed is never part of a longer character, so that lines can be tried one by one. */
function badLine(bytes: Uint8Array): number {
  const decoder = new TextDecoder('utf-8', { fatal: true });
  let line = 1;
  for (let from = 0; from < bytes.length; line++) {
    const feed = bytes.indexOf(10, from);
    const to = feed < 0 ? bytes.length : feed + 1;
    try {
      decoder.decode(bytes.subarray(from, to));
    } catch {
      return line;
    }
    from = to;
  }
  return line;
}
