import { useCoreWords } from '../../coreServices.ts';
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
  return (
    <section
      className={`zones zones-${zones.kind} ${covered ? 'zones-covered' : ''}`}
      aria-label={covered ? room.coveredZones : room.zones}
    >
      {zones.zones.map((target) => (
        <OneTarget key={target.kind === 'code' ? target.code.id : target.kind} target={target} inZone />
      ))}
      {zones.middle !== null && (
        <div className="zone-middle">
          <OneTarget target={zones.middle} inZone />
        </div>
      )}
    </section>
  );
}
