/** Numbers, dates and plurals as people read them. Every figure on a screen or in a text goes through here. */
export interface Format {
  readonly locale: string;
  /** `1,204` */
  whole(n: number): string;
  /** one decimal, true minus: `−3.4` */
  decimal(n: number): string;
  /** a given number of decimals */
  fixed(n: number, digits: number): string;
  /** whole percent from 0–100: `71 %` */
  percent(n: number): string;
  /** percent with one decimal: `89.7 %` */
  percentFine(n: number): string;
  /** signed points: `+13.8`, `−4.0`, `0.0` */
  points(n: number): string;
  /** kappa and its like, two decimals, no leading zero: `.76`, `−.05`, `1.00` */
  kappa(n: number): string;
  /** p as the field writes it: `.061`, `< .001` */
  p(n: number): string;
  /** minutes and seconds left: `14:20` */
  clock(ms: number): string;
  /** `Tuesday 3 November` from an ISO date, as it was where it was written */
  day(isoDate: string): string;
  /** `10:42` from a wall time, as it was where it was written */
  time(wall: string): string;
  /** the form that a number takes */
  plural(n: number, forms: { readonly one: string; readonly other: string }): string;
  /** `a, b and c` */
  list(items: readonly string[]): string;
}

const narrowSpace = '\u202f';
const minus = '\u2212';

export function formatFor(locale: string): Format {
  const wholes = new Intl.NumberFormat(locale, { maximumFractionDigits: 0 });
  const rules = new Intl.PluralRules(locale);
  const lists = new Intl.ListFormat(locale, { type: 'conjunction' });
  const days = new Intl.DateTimeFormat(locale, {
    weekday: 'long',
    day: 'numeric',
    month: 'long',
    timeZone: 'UTC',
  });
  const trueMinus = (text: string): string => text.replace('-', minus);
  const fixed = (n: number, digits: number): string =>
    trueMinus(
      new Intl.NumberFormat(locale, {
        minimumFractionDigits: digits,
        maximumFractionDigits: digits,
        signDisplay: 'negative',
      }).format(n),
    );
  return {
    locale,
    whole: (n) => trueMinus(wholes.format(n)),
    decimal: (n) => fixed(n, 1),
    fixed,
    percent: (n) => `${trueMinus(wholes.format(n))}${narrowSpace}%`,
    percentFine: (n) => `${fixed(n, 1)}${narrowSpace}%`,
    points: (n) => (Number(n.toFixed(1)) > 0 ? `+${fixed(n, 1)}` : fixed(n, 1)),
    kappa: (n) => fixed(n, 2).replace(/^(\u2212?)0(?=\D)/, '$1'),
    p: (n) => (n < 0.001 ? `<${narrowSpace}.001` : fixed(n, 3).replace(/^0(?=\D)/, '')),
    clock: (ms) => {
      const seconds = Math.max(0, Math.ceil(ms / 1000));
      return `${Math.floor(seconds / 60)}:${String(seconds % 60).padStart(2, '0')}`;
    },
    day: (isoDate) => {
      // The date alone, read as a day of UTC and written as one: the day as it was where it was written.
      const day = new Date(`${isoDate.slice(0, 10)}T00:00:00Z`);
      return Number.isNaN(day.getTime()) ? isoDate : days.format(day);
    },
    time: (wall) => wall.slice(11, 16),
    plural: (n, forms) => (rules.select(n) === 'one' ? forms.one : forms.other),
    list: (items) => lists.format(items),
  };
}
