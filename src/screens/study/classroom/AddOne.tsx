import { useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import { addChild, removeChild } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { Check } from '../../../ui/Choice.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { useServices } from '../../services.ts';
import { suggestPseudonym } from '../suggestPseudonym.ts';
import { useDoing } from '../useDoing.tsx';

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
    const added = await run(
      addChild(deps, classroom.id, {
        pseudonym,
        stratum: stratum.trim() === '' ? null : stratum,
        consent,
      }),
    );
    if (!added.ok) return;
    setTyped(null);
    const child = added.value.children.at(-1);
    tell(words.study.added({ name: child?.pseudonym ?? pseudonym }), () =>
      removeChild(deps, classroom.id, child?.id ?? ''),
    );
  };
  return (
    <form
      className="stack-tight"
      onSubmit={(event) => {
        event.preventDefault();
        void add();
      }}
    >
      <TextField
        label={words.study.pseudonym}
        hint={words.study.pseudonymHint}
        maxLength={200}
        value={pseudonym}
        onChange={(event) => setTyped(event.target.value)}
      />
      <TextField
        label={words.study.stratum}
        hint={words.study.stratumHint}
        maxLength={200}
        value={stratum}
        onChange={(event) => setStratum(event.target.value)}
      />
      <Check label={words.study.consent} checked={consent} onChange={setConsent} />
      {notice}
      <div className="row">
        <Button type="submit" disabled={busy}>
          {words.study.addChild}
        </Button>
      </div>
    </form>
  );
}
