import { useCoreWords } from '../../coreServices.ts';
import type { EdgeTarget } from '../codeEdges.ts';
import { OneTarget } from '../Edge.tsx';
import type { Zones } from './zones.ts';
import './zones.css';

interface Props {
  readonly zones: Zones;
  /** Without words and signs on the glass: only their places are left, and their names for screen readers. */
  readonly covered?: boolean;
}

/** The fixed places: a touch anywhere in one counts. */
export function ZoneTargets({ zones, covered = false }: Props) {
  const { room } = useCoreWords();
  const { left, right, foot } = zones;
  const one = (target: EdgeTarget, place: string) => (
    <div key={place} className={`zone zone-${place}`}>
      <OneTarget target={target} inZone />
    </div>
  );
  return (
    <section
      className={`zones zones-${zones.kind} ${covered ? 'zones-covered' : ''}`}
      aria-label={covered ? room.coveredZones : room.zones}
    >
      {left.map((target, i) => one(target, `left-${i + 1}`))}
      {right.map((target, i) => one(target, `right-${i + 1}`))}
      {foot !== null && one(foot, 'foot')}
    </section>
  );
}
