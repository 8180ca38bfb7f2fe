import { newId } from '../../../kernel/ids.ts';
import { ok } from '../../../kernel/result.ts';
import type { Code, CodeSet } from '../../../model/codeSet.ts';
import { Button } from '../../../ui/Button.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { HeldButton } from '../../../ui/HeldButton.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { starterSets } from '../starterTexts.ts';
import { useDoing } from '../useDoing.tsx';
import { CodeFields } from './CodeFields.tsx';
import { codeKinds } from './codeKinds.ts';

interface Props {
  readonly set: CodeSet;
  readonly onChange: (set: CodeSet) => void;
}

/** Two to six codes, in the order in which they stand in the room. */
export function CodesSheet({ set, onChange }: Props) {
  const { words, deps } = useServices();
  const { study } = words;
  const { tell, notice } = useDoing();
  const kinds = codeKinds(set.codes);
  const put = (codes: readonly Code[]) => onChange({ ...set, codes: [...codes] });
  const undoTo = (standing: CodeSet) => async () => {
    onChange(standing);
    return ok(null);
  };
  const move = (from: number, to: number) => {
    const codes = [...set.codes];
    codes.splice(to, 0, ...codes.splice(from, 1));
    put(codes);
  };
  const name = (code: Code, i: number) =>
    code.label.trim() === '' ? study.codeUnnamed({ n: i + 1 }) : code.label;
  return (
    <Sheet title={study.codes}>
      <div className="stack">
        <div className="stack-tight">
          <p className="second">{study.codesNote}</p>
          <p className="second small">
            {study.codesKeys} <a href="#/study/observers">{study.codesKeysTo}</a>
          </p>
        </div>
        <div className="row">
          {starterSets(words).map((starter) => (
            <Button
              key={starter.name}
              onClick={() => {
                onChange(starter);
                tell(study.starterUsed({ name: starter.name }), undoTo(set));
              }}
            >
              {study.beginWith({ name: starter.name })}
            </Button>
          ))}
        </div>
        {notice}
        <TextField
          label={study.codeSetName}
          maxLength={200}
          value={set.name}
          onChange={(event) => onChange({ ...set, name: event.target.value })}
        />
        <ol className="code-list">
          {set.codes.map((code, i) => (
            <li key={code.id}>
              <CodeFields
                code={code}
                number={i + 1}
                name={name(code, i)}
                kind={kinds[i] ?? 'other'}
                onChange={(next) => put(set.codes.map((one) => (one.id === code.id ? next : one)))}
                onUp={i === 0 ? null : () => move(i, i - 1)}
                onDown={i === set.codes.length - 1 ? null : () => move(i, i + 1)}
                onTakeAway={
                  set.codes.length <= 2
                    ? null
                    : () => {
                        put(set.codes.filter((one) => one.id !== code.id));
                        tell(study.codeTaken({ name: name(code, i) }), undoTo(set));
                      }
                }
              />
            </li>
          ))}
        </ol>
        <div className="row">
          <HeldButton
            why={set.codes.length >= 6 ? study.codesMost : null}
            onClick={() =>
              put([
                ...set.codes,
                {
                  id: newId(deps.random),
                  label: '',
                  role: 'off-task',
                  definition: '',
                  examples: '',
                  nonExamples: '',
                },
              ])
            }
          >
            {study.addCode}
          </HeldButton>
        </div>
      </div>
    </Sheet>
  );
}
