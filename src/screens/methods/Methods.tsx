import { useEffect, useState } from 'react';
import type { About } from '../../stats/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Figures } from '../../ui/Figures.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { useWords } from '../services.ts';
import { type Check, MeasureLine } from './MeasureLine.tsx';
import './methods.css';

interface Loaded {
  readonly measures: readonly About[];
  readonly holds: (about: About, got: number) => boolean;
}

/** Methods and checks: every measure works its published example out again on this device, one after the other. */
export function Methods() {
  const words = useWords();
  const [loaded, setLoaded] = useState<Loaded | null>(null);
  const [checks, setChecks] = useState<readonly Check[]>([]);
  useEffect(() => {
    let here = true;
    import('../../stats/index.ts').then(({ measures, checkHolds }) => {
      // `checkHolds` asks the record to recompute; what has been recomputed once is handed back to it.
      const holds = (about: About, got: number) => checkHolds({ ...about, recompute: () => got });
      if (here) setLoaded({ measures, holds });
    });
    return () => {
      here = false;
    };
  }, []);
  const measures = loaded?.measures ?? [];
  const next = measures[checks.length];
  // One a turn, so that the page stays alive on a slow tablet.
  useEffect(() => {
    if (next === undefined || loaded === null) return;
    const got = next.recompute();
    setChecks((before) =>
      before.length === checks.length ? [...before, { got, equal: loaded.holds(next, got) }] : before,
    );
  }, [next, loaded, checks.length]);
  if (loaded === null) return <PageHead>{words.methods.loading}</PageHead>;
  const equal = checks.filter((check) => check.equal).length;
  const done = checks.length === measures.length;
  return (
    <div className="stack">
      <PageHead note={words.methods.note}>
        {done
          ? words.methods.title({ equal, of: measures.length })
          : words.methods.workingTitle({ done: checks.length, of: measures.length })}
      </PageHead>
      <Figures
        items={[
          { name: words.methods.measuresCount, value: words.f.whole(measures.length) },
          { name: words.methods.equalCount, value: words.f.whole(equal) },
          { name: words.methods.differsCount, value: words.f.whole(checks.length - equal) },
        ]}
      />
      <Sheet flush>
        <ul className="measures">
          {measures.map((about, k) => (
            <MeasureLine key={about.name} about={about} check={checks[k] ?? null} />
          ))}
        </ul>
      </Sheet>
      {done && (
        <div className="not-in-print">
          <Button onClick={() => setChecks([])}>{words.methods.again}</Button>
        </div>
      )}
    </div>
  );
}
