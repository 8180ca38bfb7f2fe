import { useRef, useState } from 'react';
import { useLocation } from 'wouter';
import type { Study } from '../../../model/study.ts';
import { askRemoveStudy, type RemovalQuestion, removeStudy } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { Dialog } from '../../../ui/Dialog.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { HeldButton } from '../../../ui/HeldButton.tsx';
import { leadTo } from '../../../ui/leadTo.ts';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';

/** The one thing that cannot be taken back: it asks for the study's name. */
export function RemoveStudy({ study }: { readonly study: Study }) {
  const { words, deps } = useServices();
  const [, go] = useLocation();
  const [question, setQuestion] = useState<RemovalQuestion | null>(null);
  const [typed, setTyped] = useState('');
  const field = useRef<HTMLDivElement>(null);
  const { run, notice, busy } = useDoing();
  const ask = async () => {
    const asked = await run(askRemoveStudy(deps, study.id));
    if (asked.ok) setQuestion(asked.value);
  };
  const close = () => {
    setQuestion(null);
    setTyped('');
  };
  const remove = async ({ token }: RemovalQuestion) => {
    const removed = await run(removeStudy(deps, study.id, token));
    close();
    if (removed.ok) go('/study');
  };
  const same = question !== null && typed.trim().toLowerCase() === question.name.trim().toLowerCase();
  return (
    <Sheet title={words.study.removeStudy}>
      <div className="stack-tight">
        <p className="second">{words.study.removeText}</p>
        {notice}
        <div className="row">
          <Button disabled={busy} onClick={ask}>
            {words.study.removeOpen}
          </Button>
        </div>
      </div>
      {question !== null && (
        <Dialog
          title={words.study.removeTitle({ name: question.name })}
          onClose={close}
          actions={
            <>
              <Button onClick={close}>{words.study.removeKeep}</Button>
              <HeldButton
                disabled={busy}
                why={same ? null : words.study.removeFirst}
                onWhy={() => leadTo(field.current)}
                onClick={() => remove(question)}
              >
                {words.study.removeNow}
              </HeldButton>
            </>
          }
        >
          <p>
            {words.study.removeWhat({
              classes: question.classes,
              sessions: question.sessions,
              left: question.notHandedOver,
            })}
          </p>
          <div ref={field}>
            <TextField
              label={words.study.removeType({ name: question.name })}
              value={typed}
              onChange={(event) => setTyped(event.target.value)}
            />
          </div>
        </Dialog>
      )}
    </Sheet>
  );
}
