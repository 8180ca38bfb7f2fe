import { useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import { Button } from '../../../ui/Button.tsx';
import { Check } from '../../../ui/Choice.tsx';
import { TextArea } from '../../../ui/Field.tsx';
import { FileButton } from '../../../ui/FileButton.tsx';
import { useServices, useWords } from '../../services.ts';
import { useListImport } from './useListImport.ts';

/** Lines that were typed or pasted. */
export function AddFromList({ classroom }: { readonly classroom: Classroom }) {
  const { words } = useServices();
  const [lines, setLines] = useState('');
  const [consent, setConsent] = useState(false);
  const { take, notice, busy } = useListImport(classroom);
  return (
    <div className="stack-tight">
      <TextArea
        label={words.study.list}
        hint={words.study.listHint}
        value={lines}
        onChange={(event) => setLines(event.target.value)}
      />
      <Columns />
      <Check label={words.study.consentFromList} checked={consent} onChange={setConsent} />
      {notice}
      <div className="row">
        <Button
          disabled={busy}
          onClick={async () => {
            // What is taken over leaves the field: lines without consent stay nowhere, not even on the screen.
            if (await take({ content: lines, consent })) setLines('');
          }}
        >
          {words.study.takeList}
        </Button>
      </div>
    </div>
  );
}

/** A CSV file of the class. */
export function AddFromFile({ classroom }: { readonly classroom: Classroom }) {
  const { words } = useServices();
  const [consent, setConsent] = useState(false);
  const { take, notice } = useListImport(classroom);
  return (
    <div className="stack-tight">
      <p className="second small">{words.study.fileHint}</p>
      <Columns />
      <Check label={words.study.consentFromList} checked={consent} onChange={setConsent} />
      {notice}
      <div className="row">
        <FileButton
          accept=".csv,.txt,text/csv,text/plain"
          onFiles={async ([file]) => {
            if (file === undefined) return;
            await take({ name: file.name, content: new Uint8Array(await file.arrayBuffer()), consent });
          }}
        >
          {words.study.takeFile}
        </FileButton>
      </div>
    </div>
  );
}

/** What a list may say of a child beside its pseudonym, each with an example. */
function Columns() {
  const { study } = useWords();
  const columns = [
    [study.columnConsent, study.columnConsentText],
    [study.columnStratum, study.columnStratumText],
    [study.columnSeat, study.columnSeatText],
  ];
  return (
    <dl className="list-columns second small">
      {columns.map(([name, text]) => (
        <div key={name}>
          <dt>{name}</dt>
          <dd>{text}</dd>
        </div>
      ))}
    </dl>
  );
}
