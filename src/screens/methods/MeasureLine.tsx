import type { About } from '../../stats/index.ts';
import { Hold, Ring, Tick } from '../../ui/Sign.tsx';
import { useWords } from '../services.ts';

export interface Check {
  readonly got: number;
  readonly equal: boolean;
}

/** One measure: what it tells, its formula and source, and its check as expected and as worked out here. */
export function MeasureLine({ about, check }: { readonly about: About; readonly check: Check | null }) {
  const words = useWords();
  const verdict =
    check === null ? words.methods.waiting : check.equal ? words.methods.equal : words.methods.differs;
  return (
    <li className="measure">
      <span className="measure-sign">
        {check === null ? <Ring /> : check.equal ? <Tick /> : <Hold />}
        <span className="visually-hidden">{verdict}</span>
      </span>
      <div className="stack-tight">
        <h2>{about.name}</h2>
        <p>{about.sentence}</p>
        <dl className="measure-facts">
          <dt>{words.methods.formula}</dt>
          <dd>{about.formula}</dd>
          <dt>{words.methods.source}</dt>
          <dd>{about.source}</dd>
          <dt>{words.methods.check}</dt>
          <dd>
            <code>{about.check.input}</code>
          </dd>
          <dt>{words.methods.expected}</dt>
          <dd>
            {words.methods.value({ value: about.check.expected })} ({about.check.source})
          </dd>
          <dt>{words.methods.got}</dt>
          <dd>
            {check === null ? verdict : `${words.methods.value({ value: check.got })}, ${verdict}`} (
            {words.methods.tolerance({ value: about.check.tolerance })})
          </dd>
        </dl>
      </div>
    </li>
  );
}
