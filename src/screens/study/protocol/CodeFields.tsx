import type { Code, CodeRole } from '../../../model/codeSet.ts';
import { Choice } from '../../../ui/Choice.tsx';
import { TextArea, TextField } from '../../../ui/Field.tsx';
import { HeldButton } from '../../../ui/HeldButton.tsx';
import { CodeSign } from '../../../ui/Sign.tsx';
import { useWords } from '../../services.ts';

interface Props {
  readonly code: Code;
  readonly number: number;
  readonly name: string;
  readonly kind: number | 'other';
  readonly onChange: (code: Code) => void;
  readonly onUp: (() => void) | null;
  readonly onDown: (() => void) | null;
  readonly onTakeAway: (() => void) | null;
}

/** One code: its label, how it counts, and what it means. */
export function CodeFields({ code, number, name, kind, onChange, onUp, onDown, onTakeAway }: Props) {
  const { study } = useWords();
  return (
    <fieldset className="choice code-fields">
      <legend className="visually-hidden">{study.codeGroup({ n: number })}</legend>
      <CodeSign kind={kind} />
      <div className="stack-tight">
        <TextField
          label={study.codeLabel({ n: number })}
          maxLength={200}
          value={code.label}
          onChange={(event) => onChange({ ...code, label: event.target.value })}
        />
        <Choice<CodeRole>
          legend={study.counts}
          value={code.role}
          onChange={(role) => onChange({ ...code, role })}
          options={[
            { value: 'on-task', label: study.countsOn },
            { value: 'off-task', label: study.countsOff },
            { value: 'other', label: study.countsOther },
          ]}
        />
        <details open={code.definition === ''}>
          <summary>{study.wording}</summary>
          <div className="stack-tight">
            <TextArea
              label={study.definition}
              maxLength={10_000}
              value={code.definition}
              onChange={(event) => onChange({ ...code, definition: event.target.value })}
            />
            <TextArea
              label={study.examples}
              maxLength={10_000}
              value={code.examples}
              onChange={(event) => onChange({ ...code, examples: event.target.value })}
            />
            <TextArea
              label={study.nonExamples}
              maxLength={10_000}
              value={code.nonExamples}
              onChange={(event) => onChange({ ...code, nonExamples: event.target.value })}
            />
          </div>
        </details>
        <div className="row">
          <HeldButton
            why={onUp === null ? study.upmost : null}
            aria-label={study.moveUp({ name })}
            onClick={() => onUp?.()}
          >
            {study.up}
          </HeldButton>
          <HeldButton
            why={onDown === null ? study.downmost : null}
            aria-label={study.moveDown({ name })}
            onClick={() => onDown?.()}
          >
            {study.down}
          </HeldButton>
          <HeldButton
            look="quiet"
            why={onTakeAway === null ? study.codesFewest : null}
            aria-label={study.takeCodeAway({ name })}
            onClick={() => onTakeAway?.()}
          >
            {study.takeAway}
          </HeldButton>
        </div>
      </div>
    </fieldset>
  );
}
