import { useEffect, useState } from 'react';
import type { VisitPlan } from '../../../model/visitPlan.ts';
import { type ShownCard, showCard } from '../../../tasks/showCard.ts';
import { Button } from '../../../ui/Button.tsx';
import { Dialog } from '../../../ui/Dialog.tsx';
import { Notice } from '../../../ui/Notice.tsx';
import { say } from '../../../words/say.ts';
import { useServices } from '../../services.ts';
import { CardPicture } from './CardPicture.tsx';
import { useTurns } from './useTurns.ts';
import { visitSaid } from './visitSaid.ts';
import './card.css';

interface Props {
  readonly plan: VisitPlan;
  readonly onClose: () => void;
}

/** The visit as pictures, for the camera of the second tablet. */
export function ShowCard({ plan, onClose }: Props) {
  const { words, deps } = useServices();
  const [card, setCard] = useState<ShownCard | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  useEffect(() => {
    let here = true;
    void showCard(deps, plan).then((made) => {
      if (!here) return;
      if (made.ok) setCard(made.value);
      else setProblem(say(words.problems, made.problem));
    });
    return () => {
      here = false;
    };
  }, [deps, plan, words]);
  return (
    <Dialog
      title={words.pairing.showTitle}
      onClose={onClose}
      actions={<Button onClick={onClose}>{words.common.done}</Button>}
    >
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
      {problem === null && card === null && <p className="second">{words.pairing.making}</p>}
      {card !== null && (
        <div className="card">
          <Pictures pictures={card.pictures} />
          <div className="stack-tight">
            <p>{words.pairing.how({ n: card.pictures.length })}</p>
            <p className="second">{words.pairing.what({ ...visitSaid(plan), seats: plan.plan !== null })}</p>
            <AsText text={card.text} />
          </div>
        </div>
      )}
    </Dialog>
  );
}

function Pictures({ pictures }: Pick<ShownCard, 'pictures'>) {
  const { words } = useServices();
  const { at, turning, setTurning, step } = useTurns(pictures.length);
  const matrix = pictures[at];
  if (matrix === undefined) return null;
  const label = words.pairing.picture({ number: at + 1, of: pictures.length });
  return (
    <div className="stack-tight">
      <CardPicture matrix={matrix} label={label} />
      {pictures.length > 1 && (
        <div className="card-turns">
          <Button onClick={() => step(-1)}>{words.pairing.previous}</Button>
          <span className="card-number">{label}</span>
          <Button onClick={() => step(1)}>{words.pairing.next}</Button>
          <Button look="quiet" onClick={() => setTurning(!turning)}>
            {turning ? words.pairing.stay : words.pairing.turn}
          </Button>
        </div>
      )}
    </div>
  );
}

function AsText({ text }: { readonly text: string }) {
  const { words, device } = useServices();
  const [copied, setCopied] = useState<boolean | null>(null);
  const [open, setOpen] = useState(false);
  const [head = '', ...rest] = text.split('\n');
  const [lines, end] = [rest.slice(0, -1), rest.at(-1)];
  const copy = async () => {
    const done = await device.copyText(text);
    setCopied(done);
    if (!done) setOpen(true);
  };
  return (
    <>
      <div className="row">
        <Button onClick={copy}>{words.pairing.copy}</Button>
        {!open && (
          <Button look="quiet" onClick={() => setOpen(true)}>
            {words.pairing.textShow}
          </Button>
        )}
      </div>
      {copied !== null && (
        <Notice kind={copied ? 'done' : 'hold'}>
          {copied ? words.pairing.copied : words.pairing.copyFailed}
        </Notice>
      )}
      {open ? (
        <>
          <p className="second small">{words.pairing.textLength({ n: text.length })}</p>
          {/* Its head and its end are lines of no number. */}
          <figure className="card-text" aria-label={words.pairing.text}>
            <p>{head}</p>
            <ol>
              {lines.map((line) => (
                <li key={line}>{line.replace(/([^:]{5})(?=[^:])/g, '$1 ')}</li>
              ))}
            </ol>
            <p>{end}</p>
          </figure>
        </>
      ) : (
        <p className="second small">{words.pairing.textLength({ n: text.length })}</p>
      )}
    </>
  );
}
