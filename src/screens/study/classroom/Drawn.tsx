import type { Classroom, Draw } from '../../../model/classroom.ts';
import { undoDraw } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { useServices } from '../../services.ts';
import { useDoing } from '../useDoing.tsx';

interface Props {
  readonly classroom: Classroom;
  readonly draw: Draw;
  /** Told the seed of a draw that was taken back. */
  readonly onBack: (seed: string) => void;
}

/** Who was drawn, in order, with the seed; it can be taken back until a session has used it. */
export function Drawn({ classroom, draw, onBack }: Props) {
  const { words, deps } = useServices();
  const { run, notice, busy } = useDoing();
  const inDraw = new Set(draw.from);
  const late = classroom.children.filter((child) => !child.removed && !inDraw.has(child.id)).length;
  const takeBack = async () => {
    const { seed } = draw;
    const undone = await run(undoDraw(deps, classroom.id));
    if (undone.ok) onBack(seed);
  };
  return (
    <div className="stack-tight">
      <h3>{words.study.drawnInOrder}</h3>
      <Names classroom={classroom} ids={draw.chosen} numbered />
      {draw.reserves.length === 0 ? (
        <p className="second">{words.study.noReserves}</p>
      ) : (
        <>
          <h3>{words.study.reservesInOrder}</h3>
          <Names classroom={classroom} ids={draw.reserves} />
        </>
      )}
      <p className="second small">{words.study.drawKept({ seed: draw.seed, from: draw.from.length })}</p>
      {late > 0 && <p>{words.study.drawLate({ n: late })}</p>}
      <p className="second small">{words.study.drawStands}</p>
      {notice}
      <div className="row">
        <Button disabled={busy} onClick={takeBack}>
          {words.study.drawBack}
        </Button>
      </div>
    </div>
  );
}

interface NamesProps {
  readonly classroom: Classroom;
  readonly ids: readonly string[];
  readonly numbered?: boolean;
}

function Names({ classroom, ids, numbered = false }: NamesProps) {
  const { study, f } = useServices().words;
  return (
    <ol className="drawn-list">
      {ids.map((id, i) => {
        const child = classroom.children.find((one) => one.id === id);
        return (
          <li key={id}>
            {numbered && <span className="second small">{f.whole(i + 1)}</span>}
            <span>{child?.pseudonym ?? id}</span>
            {child?.removed === true && <span className="second small">{study.withdrawnSign}</span>}
          </li>
        );
      })}
    </ol>
  );
}
