import { useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import { Choice } from '../../../ui/Choice.tsx';
import { useWords } from '../../services.ts';
import { AddFromFile, AddFromList } from './AddFromList.tsx';
import { AddNumbered } from './AddNumbered.tsx';
import { AddOne } from './AddOne.tsx';

type Way = 'numbered' | 'one' | 'list' | 'file';

/** Four ways to write children down. */
export function AddChildren({ classroom }: { readonly classroom: Classroom }) {
  const { study } = useWords();
  const [way, setWay] = useState<Way>(classroom.children.length === 0 ? 'numbered' : 'one');
  return (
    <div className="stack-tight">
      <Choice
        legend={study.howToAdd}
        legendHidden
        value={way}
        onChange={setWay}
        options={[
          { value: 'one', label: study.oneByOne },
          { value: 'numbered', label: study.numbered },
          { value: 'list', label: study.fromList },
          { value: 'file', label: study.fromFile },
        ]}
      />
      {way === 'one' && <AddOne classroom={classroom} />}
      {way === 'numbered' && <AddNumbered classroom={classroom} />}
      {way === 'list' && <AddFromList classroom={classroom} />}
      {way === 'file' && <AddFromFile classroom={classroom} />}
    </div>
  );
}
