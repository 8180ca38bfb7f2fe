import { useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import { Button } from '../../../ui/Button.tsx';
import { Check } from '../../../ui/Choice.tsx';
import { useServices } from '../../services.ts';
import { NumberField } from '../NumberField.tsx';
import { suggestPseudonym } from '../suggestPseudonym.ts';
import { useListImport } from './useListImport.ts';

/** So many children at once, under the next free pseudonyms. */
export function AddNumbered({ classroom }: { readonly classroom: Classroom }) {
  const { words } = useServices();
  const [count, setCount] = useState(20);
  const [consent, setConsent] = useState(false);
  const { take, notice, busy } = useListImport(classroom);
  const names = nextPseudonyms(classroom, count, words.study.animals.split(', '));
  const [first, last] = [names[0] ?? '', names.at(-1) ?? ''];
  return (
    <div className="stack-tight">
      <NumberField label={words.study.howMany} min={1} max={60} value={count} onValue={setCount} />
      <Check label={words.study.consent} checked={consent} onChange={setConsent} />
      {notice}
      <div className="row">
        <Button disabled={busy} onClick={() => take({ content: names.join('\n'), consent })}>
          {names.length === 1
            ? words.study.addNumberedOne({ first })
            : words.study.addNumbered({ first, last })}
        </Button>
      </div>
    </div>
  );
}

function nextPseudonyms(classroom: Classroom, count: number, animals: readonly string[]): string[] {
  const taken = classroom.children.map((child) => child.pseudonym);
  const names: string[] = [];
  for (let n = 0; n < count; n++) names.push(suggestPseudonym(classroom.name, [...taken, ...names], animals));
  return names;
}
