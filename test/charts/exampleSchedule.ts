import type { ScheduleRow } from '../../src/charts/scheduleLayout.ts';

/** Looks in turn: `children` rows, a look every `everyMs` at the next one, parts of `lengthMs`; `watchMs` long, or moments. */
export function inTurn(
  children: number,
  everyMs: number,
  lengthMs: number,
  parts: number,
  watchMs = 0,
): ScheduleRow[] {
  const perPart = Math.floor(lengthMs / everyMs);
  const looks = Array.from({ length: perPart }, (_, k): [number, number] =>
    watchMs === 0 ? [(k + 1) * everyMs, (k + 1) * everyMs] : [k * everyMs, k * everyMs + watchMs],
  );
  return Array.from({ length: children }, (_, c): ScheduleRow => {
    const own = looks.filter((_look, k) => k % children === c);
    const minutes = (own.length * parts * watchMs) / 60_000;
    return {
      label: `Otter-${String(c + 1).padStart(2, '0')}`,
      ends: [`${own.length * parts}`, ...(watchMs === 0 ? [] : [`${minutes.toFixed(1)} min`])],
      spans: Array.from({ length: parts }, () => own),
    };
  });
}
