/** The colours and the typeface of a chart. A saved SVG has no tokens, so they are handed in. */
export interface Palette {
  readonly sheet: string;
  readonly ink: string;
  readonly ink2: string;
  readonly rule: string;
  readonly ruleStrong: string;
  readonly blue: string;
  readonly blueSoft: string;
  readonly ochre: string;
  readonly ochreSoft: string;
  readonly font: string;
}

/** Follows the theme of the page: only for charts that stay on a screen. */
export const screenPalette: Palette = {
  sheet: 'var(--sheet)',
  ink: 'var(--ink)',
  ink2: 'var(--ink-2)',
  rule: 'var(--rule)',
  ruleStrong: 'var(--rule-strong)',
  blue: 'var(--blue)',
  blueSoft: 'var(--blue-soft)',
  ochre: 'var(--ochre)',
  ochreSoft: 'var(--ochre-soft)',
  font: 'var(--font)',
};

/** The light tokens as they are: for files and for print. */
export const paperPalette: Palette = {
  sheet: '#fffdf7',
  ink: '#1c2836',
  ink2: '#566170',
  rule: '#d8d2c2',
  ruleStrong: '#8b8676',
  blue: '#0b5a9d',
  blueSoft: '#aac5da',
  ochre: '#b4560a',
  ochreSoft: '#e8c9a8',
  font: 'Atkinson Hyperlegible Next, system-ui, sans-serif',
};
