import { useState } from 'react';
import type { Classroom } from '../../model/classroom.ts';
import type { Protocol } from '../../model/protocol.ts';
import { intervalsInPart } from '../../schedule/layOut.ts';
import { replaceAbsent } from '../../schedule/replaceAbsent.ts';
import { drawTargets } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Check } from '../../ui/Choice.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';

interface Props {
  readonly classroom: Classroom;
  readonly protocol: Protocol;
  readonly parts: number;
  readonly absent: ReadonlySet<string>;
  readonly onChange: (absent: ReadonlySet<string>) => void;
}

/** Who of the drawn children is there today, and who steps in. */
export function Attendance({ classroom, protocol, parts, absent, onChange }: Props) {
  const { words } = useServices();
  const { draw } = classroom;
  if (draw === null) return <NotDrawn classroom={classroom} protocol={protocol} />;
  const present = classroom.children.filter((child) => !child.removed);
  const nameOf = (id: string) => classroom.children.find((child) => child.id === id)?.pseudonym ?? id;
  const { children, replaced } = replaceAbsent(draw, absent, present);
  const watched = protocol.rotation.kind === 'one' ? 1 : Math.max(1, children.length);
  const intervals = intervalsInPart(protocol.partLength, protocol, children.length);
  const toggle = (id: string, here: boolean) => {
    const next = new Set(absent);
    if (here) next.delete(id);
    else next.add(id);
    onChange(next);
  };
  const steppedIn = replaced.flatMap(({ by }) => (by === null ? [] : [by]));
  return (
    <fieldset className="choice stack-tight">
      <legend className="choice-legend">{words.before.children}</legend>
      <p className="second small">{words.before.childrenHint}</p>
      <div className="choice-options">
        {[...draw.chosen, ...steppedIn, ...[...absent].filter((id) => draw.reserves.includes(id))].map(
          (id) => (
            <Check
              key={id}
              label={nameOf(id)}
              checked={!absent.has(id)}
              onChange={(here) => toggle(id, here)}
            />
          ),
        )}
      </div>
      {replaced.map(({ absent: gone, by }) => (
        <p key={gone}>
          {by === null
            ? words.before.nobodyStepsIn({ absent: nameOf(gone) })
            : words.before.stepsIn({ by: nameOf(by), absent: nameOf(gone) })}
        </p>
      ))}
      <p className="second">
        {words.before.meaning({
          looks: Math.floor(intervals / watched),
          minutes: Math.round((intervals * protocol.intervalMs) / 6000) / 10,
          children: protocol.rotation.kind === 'one' ? 1 : children.length,
          parts,
        })}
      </p>
    </fieldset>
  );
}

function NotDrawn({ classroom, protocol }: Pick<Props, 'classroom' | 'protocol'>) {
  const { words, deps } = useServices();
  const [problem, setProblem] = useState<string | null>(null);
  const count = classroom.children.filter((child) => !child.removed).length;
  const draw = async () => {
    const drawn = await drawTargets(deps, classroom.id, { id: protocol.id });
    setProblem(drawn.ok ? null : say(words.problems, drawn.problem));
  };
  return (
    <div className="stack-tight">
      <p>{count === 0 ? words.before.tooFew : words.before.notDrawn({ klass: classroom.name })}</p>
      <div className="row">
        {count > 0 && (
          <Button onClick={draw}>
            {words.before.drawNow({ n: Math.min(protocol.childrenToDraw, count) })}
          </Button>
        )}
        <a className="button button-quiet" href={`#/study/class/${classroom.id}`}>
          {words.before.toClass}
        </a>
      </div>
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
    </div>
  );
}
