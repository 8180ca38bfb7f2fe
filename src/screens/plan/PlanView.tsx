import type { CSSProperties, ReactNode } from 'react';
import type { Seat, SeatingPlan } from '../../model/seatingPlan.ts';
import { useCoreWords } from '../coreServices.ts';
import { SeatLabel } from './SeatLabel.tsx';
import { onGlass, type Place, tracks, turned } from './turned.ts';
import './planView.css';

/** What every seat has, whatever element it is. */
export interface SeatLook {
  readonly className: string;
  readonly style: CSSProperties;
  readonly 'data-joined': string;
  readonly children: ReactNode;
}

interface Props {
  readonly plan: SeatingPlan;
  /** Child id → pseudonym. A child who is not in it is not shown: the seat looks free. */
  readonly labels: ReadonlyMap<string, string>;
  /** What the picture is, for those who do not see it. */
  readonly label: string;
  /** Child to look at now: the brass seat. */
  readonly current?: string | null;
  /** Child to look at next: the dashed seat. */
  readonly next?: string | null;
  /** Seats that are meant at present: chosen by a first tap, or spoken of beside the plan. */
  readonly chosen?: string | ReadonlySet<string> | null;
  /** CSS length that the picture's height keeps within, for example `50dvh`. */
  readonly fitHeight?: string;
  /** No seat is wider than this (px). */
  readonly seatAtMost?: number;
  /** Makes every seat a button. */
  readonly onSeat?: (seat: Seat) => void;
  /** Draws a seat that has a child its own way; null leaves it as it is. */
  readonly seatAs?: (seat: Seat, look: SeatLook) => ReactNode;
  /** Makes the places where no seat stands buttons too, one place beyond each edge included. */
  readonly onPlace?: (place: Place) => void;
}

/** The seats as the observer sees them, with the observer at the bottom. */
export function PlanView(props: Props) {
  const {
    plan,
    labels,
    label,
    current = null,
    next = null,
    chosen = null,
    fitHeight,
    seatAtMost = 108,
    onSeat,
    seatAs,
    onPlace,
  } = props;
  const { plan: said } = useCoreWords();
  const isChosen = (seat: string): boolean =>
    chosen !== null && (typeof chosen === 'string' ? seat === chosen : chosen.has(seat));
  const view = turned(plan);
  const open = onPlace !== undefined;
  // While seats are put up, one more place on each side can be tapped, and aisles are as wide as seats.
  const rim = open ? 1 : 0;
  const widths = tracks(view.columns + 2 * rim, new Set(view.seats.map((s) => s.x + rim)), open ? 1 : 0.4);
  const heights = tracks(view.rows + 2 * rim, new Set(view.seats.map((s) => s.y + rim)), open ? 1 : 0.4);
  const sum = (all: readonly number[]) => all.reduce((total, one) => total + one, 0);
  const [across, down] = [sum(widths), sum(heights)];
  const widest = `${across * seatAtMost}px`;
  const style: CSSProperties & Record<`--${string}`, number> = {
    '--plan-across': across,
    '--plan-down': down,
    // Where seats are put up, every place stays wide enough for a finger; the room scrolls sideways instead.
    ...(open ? { minWidth: `${across * 44}px` } : {}),
    aspectRatio: `${across} / ${down}`,
    gridTemplateColumns: widths.map((n) => `minmax(0, ${n}fr)`).join(' '),
    gridTemplateRows: heights.map((n) => `minmax(0, ${n}fr)`).join(' '),
    width:
      fitHeight === undefined
        ? `min(100%, ${widest})`
        : `min(100%, ${widest}, (${fitHeight}) * ${across / down})`,
  };
  const at = (x: number, y: number): CSSProperties => ({ gridColumn: x + rim + 1, gridRow: y + rim + 1 });
  return (
    <figure className="plan" aria-label={label}>
      <div className={`plan-room plan-front-${view.front}`}>
        <div className="plan-seats" style={style}>
          {open &&
            freePlaces(plan).map((place) => {
              const { x, y } = onGlass(plan, place);
              return (
                <button
                  key={`${place.column} ${place.row}`}
                  type="button"
                  className="seat seat-place"
                  style={at(x, y)}
                  data-place={`${place.column} ${place.row}`}
                  aria-label={said.seatPlace({ row: y + 2, column: x + 2 })}
                  onClick={() => onPlace(place)}
                >
                  <svg className="seat-plus" viewBox="0 0 14 14" aria-hidden="true">
                    <path d="M7 0 V14 M0 7 H14" />
                  </svg>
                </button>
              );
            })}
          {view.seats.map((seat) => {
            const name = seat.child === null ? undefined : labels.get(seat.child);
            const now = name !== undefined && seat.child === current;
            const soon = !now && name !== undefined && seat.child === next;
            const state = now ? 'seat-now' : soon ? 'seat-next' : name === undefined ? 'seat-free' : '';
            const common = {
              className: `seat ${state} ${isChosen(seat.id) ? 'seat-chosen' : ''}`,
              style: at(seat.x, seat.y),
              'data-joined': seat.joined.join(' '),
            };
            const inside = name === undefined ? <span className="seat-dot" /> : <SeatLabel>{name}</SeatLabel>;
            const own = name === undefined ? null : (seatAs?.(seat, { ...common, children: inside }) ?? null);
            if (own !== null) return own;
            if (onSeat === undefined)
              return (
                <span key={seat.id} {...common}>
                  {inside}
                </span>
              );
            const place = { row: seat.y + rim + 1, column: seat.x + rim + 1 };
            return (
              <button
                key={seat.id}
                type="button"
                {...common}
                data-place={`${seat.column} ${seat.row}`}
                aria-label={name === undefined ? said.seatFree(place) : said.seatOf({ name, ...place })}
                aria-pressed={isChosen(seat.id)}
                onClick={() => onSeat(seat)}
              >
                {inside}
              </button>
            );
          })}
        </div>
      </div>
      <figcaption className="plan-you">
        <svg width="36" height="32" viewBox="0 0 36 32" aria-hidden="true">
          <circle cx="18" cy="9" r="7" />
          <path d="M2 31 C2 21 9 17 18 17 C27 17 34 21 34 31" />
        </svg>
        <span>{said.you}</span>
      </figcaption>
    </figure>
  );
}

/** Every place without a seat, with a rim of one place around the plan while it may still grow. */
function freePlaces(plan: SeatingPlan): Place[] {
  const taken = new Set(plan.seats.map((seat) => `${seat.column} ${seat.row}`));
  const places: Place[] = [];
  const [wide, deep] = [plan.columns < 20, plan.rows < 20];
  for (let row = deep ? -1 : 0; row < plan.rows + (deep ? 1 : 0); row++)
    for (let column = wide ? -1 : 0; column < plan.columns + (wide ? 1 : 0); column++)
      if (!taken.has(`${column} ${row}`)) places.push({ column, row });
  return places;
}
