import { useState } from 'react';
import { useLocation } from 'wouter';
import { createStudy } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { Form } from '../../../ui/Form.tsx';
import { useServices } from '../../services.ts';
import { newStudyTexts } from '../starterTexts.ts';
import { useDoing } from '../useDoing.tsx';

/** A study of one's own: a name is enough, the rest has beginnings. */
export function BeginStudy() {
  const { words, deps } = useServices();
  const [, go] = useLocation();
  const [name, setName] = useState('');
  const { run, notice, busy } = useDoing();
  const begin = async () => {
    const made = await run(createStudy(deps, { name, texts: newStudyTexts(words) }));
    if (made.ok) go('/study/class/new');
  };
  return (
    <Form className="stack-tight" onSubmit={begin}>
      <TextField
        label={words.study.ownName}
        hint={words.study.ownHint}
        maxLength={200}
        value={name}
        onChange={(event) => setName(event.target.value)}
      />
      {notice}
      <div className="row">
        <Button type="submit" disabled={busy}>
          {words.study.ownBegin}
        </Button>
      </div>
    </Form>
  );
}
