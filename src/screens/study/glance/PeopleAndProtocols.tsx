import type { Observer } from '../../../model/observer.ts';
import type { Protocol } from '../../../model/protocol.ts';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useWords } from '../../services.ts';
import { methodSentence } from '../methodSentence.ts';

/** The protocols of the study, each said in one line. */
export function ProtocolsSheet({ protocols }: { readonly protocols: readonly Protocol[] }) {
  const words = useWords();
  const { study } = words;
  return (
    <Sheet title={study.protocols} flush>
      {protocols.length === 0 && <p className="line-lead second">{study.noProtocols}</p>}
      <nav className="lines" aria-label={study.protocols}>
        {protocols.map((one) => (
          <a key={one.id} className="line" href={`#/study/protocol/${one.id}`}>
            <span className="grow">
              <strong>{one.name}</strong>
              <br />
              <span className="second small">{methodSentence(words, one)}</span>
            </span>
          </a>
        ))}
      </nav>
      <p className="line-foot">
        <a className="button" href="#/study/protocols/new">
          {study.newProtocol}
        </a>
      </p>
    </Sheet>
  );
}

/** Who observes. */
export function ObserversSheet({ observers }: { readonly observers: readonly Observer[] }) {
  const { study, f } = useWords();
  return (
    <Sheet title={study.observers}>
      <div className="stack-tight">
        <p className={observers.length === 0 ? 'second' : ''}>
          {observers.length === 0 ? study.noObservers : f.list(observers.map((one) => one.name))}
        </p>
        <p>
          <a className="button" href="#/study/observers">
            {study.toObservers}
          </a>
        </p>
      </div>
    </Sheet>
  );
}
