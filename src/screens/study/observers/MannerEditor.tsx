import { usualManner } from '../../../model/manners.ts';
import type { Manner, Observer } from '../../../model/observer.ts';
import { saveObserver } from '../../../tasks/index.ts';
import { MannerFields } from '../../manner/MannerFields.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';
import './keys.css';

/** How the room is laid out for one observer, and how it answers. */
export function MannerEditor({ observer }: { readonly observer: Observer }) {
  const { words, deps } = useServices();
  const { study } = words;
  const { run, tell, notice } = useDoing();
  const manner = observer.manner ?? usualManner;
  const put = async (next: Manner) => {
    const kept = await run(saveObserver(deps, observer.id, { manner: next }));
    if (kept.ok) tell(study.mannerChanged, () => saveObserver(deps, observer.id, { manner }));
  };
  return (
    <section className="keys stack-tight" aria-label={study.mannerOf({ name: observer.name })}>
      <MannerFields manner={manner} onChange={put} />
      {notice}
    </section>
  );
}
