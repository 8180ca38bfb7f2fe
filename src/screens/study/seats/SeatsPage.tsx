import type { Classroom } from '../../../model/classroom.ts';
import { PageHead } from '../../../ui/PageHead.tsx';
import { useWords } from '../../services.ts';
import { useClass } from '../classroom/useClass.ts';
import { NotHere, Stored } from '../Stored.tsx';
import { Furniture } from './Furniture.tsx';
import { Placing } from './Placing.tsx';
import { PresetForm } from './PresetForm.tsx';
import { usePlanEdits } from './usePlanEdits.ts';

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
      {plan !== null && <Placing classroom={classroom} plan={plan} edits={edits} />}
      {plan !== null && <Furniture plan={plan} edits={edits} />}
      <PresetForm classroom={classroom} edits={edits} />
    </div>
  );
}
