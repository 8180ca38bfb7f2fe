import { requireThat } from './requireThat.ts';

type Coefficients = readonly number[];

const centreTop: Coefficients = [
  3.387132872796366608, 133.14166789178437745, 1971.5909503065514427, 13731.693765509461125,
  45921.953931549871457, 67265.770927008700853, 33430.575583588128105, 2509.0809287301226727,
];
const centreBottom: Coefficients = [
  1, 42.313330701600911252, 687.1870074920579083, 5394.1960214247511077, 21213.794301586595867,
  39307.89580009271061, 28729.085735721942674, 5226.495278852545925,
];
const middleTop: Coefficients = [
  1.42343711074968357734, 4.6303378461565452959, 5.7694972214606914055, 3.64784832476320460504,
  1.27045825245236838258, 0.24178072517745061177, 0.0227238449892691845833, 7.7454501427834140764e-4,
];
const middleBottom: Coefficients = [
  1, 2.05319162663775882187, 1.6763848301838038494, 0.68976733498510000455, 0.14810397642748007459,
  0.0151986665636164571966, 5.475938084995344946e-4, 1.05075007164441684324e-9,
];
const farTop: Coefficients = [
  6.6579046435011037772, 5.4637849111641143699, 1.7848265399172913358, 0.29656057182850489123,
  0.026532189526576123093, 0.0012426609473880784386, 2.71155556874348757815e-5, 2.01033439929228813265e-7,
];
const farBottom: Coefficients = [
  1, 0.59983220655588793769, 0.13692988092273580531, 0.0148753612908506148525, 7.868691311456132591e-4,
  1.8463183175100546818e-5, 1.4215117583164458887e-7, 2.04426310338993978564e-15,
];

function polynomial(coefficients: Coefficients, x: number): number {
  let value = 0;
  for (let i = coefficients.length - 1; i >= 0; i--) value = value * x + (coefficients[i] as number);
  return value;
}

/**
 * The standard normal quantile: the z below which a share p of the distribution lies; −∞ at 0, ∞ at 1.
 * Relative error about 1e-15, also in the far lower tail (p = 1e-300), where the general library this
 * program otherwise leans on returns −∞ from 1e-20 down. Needs no library, so that plain intervals stay small.
 *
 * Source: Wichura 1988, Appl Stat 37:477-484 (algorithm AS 241, PPND16).
 *
 * @example normalQuantile(0.975) // → 1.959963984540054
 */
export function normalQuantile(p: number): number {
  requireThat(p >= 0 && p <= 1, 'p', 'must lie between 0 and 1');
  const fromCentre = p - 0.5;
  if (Math.abs(fromCentre) <= 0.425) {
    const r = 0.180625 - fromCentre * fromCentre;
    return (fromCentre * polynomial(centreTop, r)) / polynomial(centreBottom, r);
  }
  const tail = fromCentre < 0 ? p : 1 - p;
  if (tail === 0) return fromCentre < 0 ? Number.NEGATIVE_INFINITY : Number.POSITIVE_INFINITY;
  const r = Math.sqrt(-Math.log(tail));
  const size =
    r <= 5
      ? polynomial(middleTop, r - 1.6) / polynomial(middleBottom, r - 1.6)
      : polynomial(farTop, r - 5) / polynomial(farBottom, r - 5);
  return fromCentre < 0 ? -size : size;
}

/** The z of a two-sided interval: 1.96 for a confidence of 0.95. */
export function twoSidedZ(confidence: number): number {
  return -normalQuantile((1 - confidence) / 2);
}
