/** Text that a spreadsheet would run as a formula, and the sign that guards it. */
const risky = /^[=+\-@\t\r']/;

/** A text cell with its guard: what a spreadsheet would run gets a leading apostrophe. */
export function guarded(text: string): string {
  return risky.test(text) ? `'${text}` : text;
}

/** A text cell without its guard: one leading apostrophe is taken off. */
export function unguarded(text: string): string {
  return text.startsWith("'") ? text.slice(1) : text;
}

const needsQuotes = /["\r\n]|^\s|\s$/;

/** A cell as RFC 4180 writes it: in quotes where it holds the delimiter, a quote, a line break or outer blanks. */
export function quotedCell(text: string, delimiter: string): string {
  return text.includes(delimiter) || needsQuotes.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
