import { useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import { addChild, removeChild } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { Check } from '../../../ui/Choice.tsx';
import { Form } from '../../../ui/Form.tsx';
import { useServices } from '../../services.ts';
import { suggestPseudonym } from '../suggestPseudonym.ts';
import { useDoing } from '../useDoing.tsx';
import { ChildFields, childOf } from './ChildFields.tsx';

/** One child at a time; the next free pseudonym stands there already. */
export function AddOne({ classroom }: { readonly classroom: Classroom }) {
  const { words, deps } = useServices();
  const { run, tell, notice, busy } = useDoing();
  const [typed, setTyped] = useState<string | null>(null);
  const [stratum, setStratum] = useState('');
  const [consent, setConsent] = useState(false);
  const taken = classroom.children.map((child) => child.pseudonym);
  const pseudonym = typed ?? suggestPseudonym(classroom.name, taken, words.study.animals.split(', '));
  const add = async () => {
    const added = await run(addChild(deps, classroom.id, { ...childOf({ pseudonym, stratum }), consent }));
    if (!added.ok) return;
    setTyped(null);
    const child = added.value.children.at(-1);
    tell(words.study.added({ name: child?.pseudonym ?? pseudonym }), () =>
      removeChild(deps, classroom.id, child?.id ?? ''),
    );
  };
  return (
    <Form className="stack-tight" onSubmit={add}>
      <ChildFields
        value={{ pseudonym, stratum }}
        onChange={(next) => {
          if (next.pseudonym !== pseudonym) setTyped(next.pseudonym);
          setStratum(next.stratum);
        }}
      />
      <Check label={words.study.consent} checked={consent} onChange={setConsent} />
      {notice}
      <div className="row">
        <Button type="submit" disabled={busy}>
          {words.study.addChild}
        </Button>
      </div>
    </Form>
  );
}
