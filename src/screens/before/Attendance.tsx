import { useState } from 'react';
import type { Classroom, Draw } from '../../model/classroom.ts';
import type { Protocol } from '../../model/protocol.ts';
import { looksAtEverybody, type OrderOfDay, watchesOne } from '../../schedule/orderOfDay.ts';
import { drawTargets } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Check } from '../../ui/Choice.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';

interface Props {
  readonly classroom: Classroom;
  readonly protocol: Protocol;
  readonly day: OrderOfDay;
  readonly absent: ReadonlySet<string>;
  readonly onChange: (absent: ReadonlySet<string>) => void;
}

/** Who is there today, and who steps in: of the drawn children, or of the whole class where everybody is looked at. */
export function Attendance({ classroom, protocol, day, absent, onChange }: Props) {
  const { words } = useServices();
  const everybody = looksAtEverybody(protocol);
  const { draw } = classroom;
  const here = classroom.children.filter((child) => !child.removed);
  if (everybody && here.length === 0) return <NobodyYet classroom={classroom} />;
  if (!everybody && draw === null) return null;
  const nameOf = (id: string) => classroom.children.find((child) => child.id === id)?.pseudonym ?? id;
  const listed =
    everybody || draw === null ? here.map(({ id }) => id) : drawnToday(draw, protocol, day, absent);
  const toggle = (id: string, there: boolean) => {
    const next = new Set(absent);
    if (there) next.delete(id);
    else next.add(id);
    onChange(next);
  };
  return (
    <fieldset className="choice stack-tight">
      <legend className="choice-legend">
        {everybody
          ? words.before.everybody
          : watchesOne(protocol)
            ? words.before.childrenDrawn
            : words.before.children}
      </legend>
      <p className="second small">{everybody ? words.before.everybodyHint : words.before.childrenHint}</p>
      <div className="choice-options">
        {listed.map((id) => (
          <Check
            key={id}
            label={nameOf(id)}
            checked={!absent.has(id)}
            onChange={(there) => toggle(id, there)}
          />
        ))}
      </div>
      {day.replaced.map(({ absent: gone, by }) => (
        <p key={gone}>
          {by === null
            ? words.before.nobodyStepsIn({ absent: nameOf(gone) })
            : words.before.stepsIn({ by: nameOf(by), absent: nameOf(gone) })}
        </p>
      ))}
    </fieldset>
  );
}

/** The drawn children of this protocol, who stepped in for them, and reserves who are away as well. */
function drawnToday(
  draw: Draw,
  { childrenToDraw }: Protocol,
  { replaced }: OrderOfDay,
  absent: ReadonlySet<string>,
): string[] {
  const drawn = [...draw.chosen, ...draw.reserves];
  const watched = draw.chosen.slice(0, childrenToDraw);
  const steppedIn = replaced.flatMap(({ by }) => by ?? []);
  return [...new Set([...watched, ...steppedIn, ...[...absent].filter((id) => drawn.includes(id))])];
}

interface NotDrawnProps {
  readonly classroom: Classroom;
  readonly protocol: Protocol;
}

/** Nobody was drawn yet: the draw, or the way to the class. */
export function NotDrawn({ classroom, protocol }: NotDrawnProps) {
  const { words, deps } = useServices();
  const [problem, setProblem] = useState<string | null>(null);
  const count = classroom.children.filter((child) => !child.removed).length;
  if (count === 0) return <NobodyYet classroom={classroom} />;
  const draw = async () => {
    const drawn = await drawTargets(deps, classroom.id, { id: protocol.id });
    setProblem(drawn.ok ? null : say(words.problems, drawn.problem));
  };
  return (
    <div className="stack-tight">
      <p>{words.before.notDrawn({ klass: classroom.name })}</p>
      <div className="row">
        <Button onClick={draw}>
          {words.before.drawNow({ n: Math.min(protocol.childrenToDraw, count) })}
        </Button>
        <ToClass classroom={classroom} />
      </div>
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
    </div>
  );
}

function NobodyYet({ classroom }: { readonly classroom: Classroom }) {
  const { words } = useServices();
  return (
    <div className="stack-tight">
      <p>{words.before.tooFew}</p>
      <div className="row">
        <ToClass classroom={classroom} />
      </div>
    </div>
  );
}

function ToClass({ classroom }: { readonly classroom: Classroom }) {
  const { words } = useServices();
  return (
    <a className="button button-quiet" href={`#/study/class/${classroom.id}`}>
      {words.before.toClass}
    </a>
  );
}
