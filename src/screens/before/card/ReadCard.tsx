import { useEffect, useRef, useState } from 'react';
import { missingParts } from '../../../tasks/readCard.ts';
import { Button } from '../../../ui/Button.tsx';
import { TextArea } from '../../../ui/Field.tsx';
import { FileButton } from '../../../ui/FileButton.tsx';
import { HeldButton } from '../../../ui/HeldButton.tsx';
import { leadTo } from '../../../ui/leadTo.ts';
import { Notice } from '../../../ui/Notice.tsx';
import { PageHead } from '../../../ui/PageHead.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { CameraWay } from './CameraWay.tsx';
import { TakeOver } from './TakeOver.tsx';
import { type Reading, useReading } from './useReading.ts';
import './card.css';

/** The second tablet reads the card of the first: by camera, from pictures, or as a text. */
export function ReadCard() {
  const { words } = useServices();
  const reading = useReading();
  usePastedPictures(reading.takePictures);
  if (reading.visit !== null) return <TakeOver plan={reading.visit} onLeave={reading.beginAgain} />;
  return (
    <div className="stack">
      <PageHead note={words.pairing.readNote}>{words.pairing.readTitle}</PageHead>
      {reading.problem !== null && <Notice kind="hold">{reading.problem}</Notice>}
      <Progress reading={reading} />
      <div className="columns">
        <CameraWay onFrame={reading.takeFrame} />
        <div className="stack">
          <Sheet title={words.pairing.picturesTitle}>
            <div className="row">
              <p className="grow second">{words.pairing.picturesText}</p>
              <FileButton accept="image/*" multiple onFiles={reading.takePictures}>
                {words.pairing.picturesChoose}
              </FileButton>
            </div>
          </Sheet>
          <TextWay onText={reading.takeText} />
        </div>
      </div>
    </div>
  );
}

function Progress({ reading: { parts, busy, beginAgain } }: { readonly reading: Reading }) {
  const { words } = useServices();
  if (parts === null) return busy ? <p className="second">{words.pairing.reading}</p> : null;
  const missing = new Set(missingParts(parts));
  return (
    <Sheet>
      <div className="row">
        <p role="status">{words.pairing.progress({ read: parts.parts.size, of: parts.of })}</p>
        <ol className="card-parts grow">
          {Array.from({ length: parts.of }, (_, i) => i + 1).map((number) => (
            <li key={number} className={missing.has(number) ? 'card-part' : 'card-part card-part-read'}>
              <span aria-hidden="true">{number}</span>
              <span className="visually-hidden">
                {missing.has(number)
                  ? words.pairing.partMissing({ number })
                  : words.pairing.partRead({ number })}
              </span>
            </li>
          ))}
        </ol>
        <Button onClick={beginAgain}>{words.pairing.again}</Button>
      </div>
    </Sheet>
  );
}

function TextWay({ onText }: { readonly onText: Reading['takeText'] }) {
  const { words } = useServices();
  const [text, setText] = useState('');
  const field = useRef<HTMLDivElement>(null);
  return (
    <Sheet title={words.pairing.textTitle}>
      <div className="stack-tight" ref={field}>
        <TextArea
          label={words.pairing.textLabel}
          hint={words.pairing.textHint}
          value={text}
          autoCapitalize="characters"
          autoCorrect="off"
          spellCheck={false}
          onChange={(event) => setText(event.target.value)}
        />
        <div className="row">
          <HeldButton
            why={text.trim() === '' ? words.pairing.textFirst : null}
            onWhy={() => leadTo(field.current)}
            onClick={() => onText(text)}
          >
            {words.pairing.textRead}
          </HeldButton>
        </div>
      </div>
    </Sheet>
  );
}

/** Pictures that are pasted anywhere on the page; a pasted text goes to its field as ever. */
function usePastedPictures(take: Reading['takePictures']): void {
  const latest = useRef(take);
  useEffect(() => {
    latest.current = take;
  });
  useEffect(() => {
    const pasted = (event: ClipboardEvent): void => {
      const pictures = [...(event.clipboardData?.files ?? [])];
      if (pictures.length === 0) return;
      event.preventDefault();
      void latest.current(pictures);
    };
    document.addEventListener('paste', pasted);
    return () => document.removeEventListener('paste', pasted);
  }, []);
}
