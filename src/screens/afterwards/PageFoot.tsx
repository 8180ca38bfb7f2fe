import { Button } from '../../ui/Button.tsx';
import { useServices } from '../services.ts';

/** The foot of a results page: back to the list, and on paper. */
export function PageFoot() {
  const { words, device } = useServices();
  return (
    <div className="row not-in-print">
      <a className="button" href="#/afterwards">
        {words.afterwards.toVisits}
      </a>
      <Button look="quiet" onClick={() => device.print()}>
        {words.afterwards.print}
      </Button>
    </div>
  );
}
