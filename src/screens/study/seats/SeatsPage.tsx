import { useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import { Choice } from '../../../ui/Choice.tsx';
import { PageHead } from '../../../ui/PageHead.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useWords } from '../../services.ts';
import { useClass } from '../classroom/useClass.ts';
import { NotHere, Stored } from '../Stored.tsx';
import { Furniture } from './Furniture.tsx';
import { Placing } from './Placing.tsx';
import { PresetForm } from './PresetForm.tsx';
import { SideChoice } from './SideChoice.tsx';
import { usePlanEdits } from './usePlanEdits.ts';
import './seats.css';

/** /study/class/:id/seats: how the room stands, and who sits where. */
export function SeatsPage({ id }: { readonly id: string }) {
  return (
    <Stored answer={useClass(id)}>
      {(found) => (found === null ? <NotHere /> : <Seats classroom={found.classroom} />)}
    </Stored>
  );
}

function Seats({ classroom }: { readonly classroom: Classroom }) {
  const { study } = useWords();
  const edits = usePlanEdits(classroom);
  const [work, setWork] = useState<'place' | 'build'>('place');
  const { plan } = classroom;
  return (
    <div className="stack">
      <PageHead
        about={<a href={`#/study/class/${classroom.id}`}>{study.backToClass({ klass: classroom.name })}</a>}
        note={study.seatsNote}
      >
        {study.seatsTitle({ klass: classroom.name })}
      </PageHead>
      {edits.notice}
      {plan !== null && (
        <Sheet>
          <div className="stack">
            <Choice
              legend={study.seatsWork}
              legendHidden
              value={work}
              onChange={setWork}
              options={[
                { value: 'place', label: study.seatsPlace },
                { value: 'build', label: study.seatsBuild },
              ]}
            />
            {work === 'place' ? (
              <Placing classroom={classroom} plan={plan} edits={edits} />
            ) : (
              <Furniture classroom={classroom} plan={plan} edits={edits} />
            )}
            <SideChoice plan={plan} edits={edits} />
          </div>
        </Sheet>
      )}
      <PresetForm classroom={classroom} edits={edits} />
    </div>
  );
}
