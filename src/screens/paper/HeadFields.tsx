import { useState } from 'react';
import { clockTime, minutesAndSeconds } from '../../kernel/typedTime.ts';
import type { PaperPart } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Choice } from '../../ui/Choice.tsx';
import { SelectField, TextField } from '../../ui/Field.tsx';
import { PurposeChoice } from '../before/PurposeChoice.tsx';
import { useNewObserver } from '../before/useNewObserver.tsx';
import { useServices, useWords } from '../services.ts';
import { TimeField } from './TimeField.tsx';
import type { Typing } from './useTyping.ts';

/** Who wrote the sheet, when it began, and when its parts did. */
export function HeadFields({ typing, last }: { readonly typing: Typing; readonly last: number }) {
  const { words, useStored } = useServices();
  const { paper } = words;
  const { draft, change } = typing;
  const { plan } = draft;
  const answer = useStored((store) => store.observers(plan.study.id), [plan.study.id]);
  const observers = answer?.ok ? answer.value : [];
  const [adding, setAdding] = useState(false);
  const { field } = useNewObserver(plan.study.id, ({ id }) => {
    setAdding(false);
    change({ observer: id });
  });
  const part = (k: number, changes: Partial<PaperPart>) =>
    change({ parts: draft.parts.map((one, at) => (at === k ? { ...one, ...changes } : one)) });
  return (
    <div className="stack">
      <div className="stack-tight">
        <div className="typing-fields">
          <SelectField
            label={paper.observer}
            value={draft.observer ?? ''}
            onChange={(event) => change({ observer: event.target.value === '' ? null : event.target.value })}
          >
            <option value="">{paper.observerChoose}</option>
            {observers.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </SelectField>
          {observers.length > 0 && (
            <Button look="quiet" aria-expanded={adding} onClick={() => setAdding(!adding)}>
              {paper.addObserver}
            </Button>
          )}
        </div>
        {(adding || observers.length === 0) && answer !== undefined && field}
      </div>
      <div className="typing-fields">
        <TextField
          label={paper.date}
          type="date"
          value={draft.date}
          onChange={(event) => change({ date: event.target.value })}
        />
        <ClockField
          label={paper.start}
          hint={paper.timeHint}
          value={draft.start}
          onValue={(start) => change({ start })}
        />
        {plan.schedule.protocol.method === 'duration' ? (
          <MinutesField
            label={paper.stoppedAt}
            hint={paper.stoppedHint}
            value={draft.stoppedAt}
            onValue={(stoppedAt) => change({ stoppedAt })}
          />
        ) : (
          <NumberField
            label={paper.stopped}
            hint={paper.stoppedHint}
            value={draft.stoppedAfter}
            most={last}
            onValue={(stoppedAfter) => change({ stoppedAfter })}
          />
        )}
      </div>
      {draft.parts.map((one, k) => {
        const phase = plan.schedule.phases[k + 1] ?? '';
        return (
          <div className="typing-fields" key={phase}>
            <ClockField
              label={paper.breakStarted}
              value={one.breakStarted}
              onValue={(breakStarted) => part(k, { breakStarted })}
            />
            <ClockField
              label={paper.firstTask({ phase })}
              hint={paper.firstTaskHint}
              value={one.firstTask}
              onValue={(firstTask) => part(k, { firstTask })}
            />
          </div>
        );
      })}
      <Choice
        legend={paper.role}
        value={draft.role ?? 'alone'}
        onChange={(role) => change({ role: role === 'alone' ? null : role })}
        options={[
          { value: 'alone', label: paper.alone },
          { value: 'primary', label: paper.primary, hint: words.before.rolePrimaryHint },
          { value: 'second', label: paper.second, hint: words.before.roleSecondHint },
        ]}
      />
      <PurposeChoice
        purpose={draft.familiarisation === true ? 'familiarisation' : draft.practice ? 'practice' : 'record'}
        onChange={(purpose) =>
          change({ practice: purpose === 'practice', familiarisation: purpose === 'familiarisation' })
        }
      />
    </div>
  );
}

interface ClockProps {
  readonly label: string;
  readonly hint?: string;
  readonly value: string;
  readonly onValue: (value: string) => void;
}

/** A time of the clock. */
function ClockField({ value, onValue, ...rest }: ClockProps) {
  const { problems } = useWords();
  return (
    <TimeField
      {...rest}
      text={value}
      tidy={clockTime}
      wrong={(found) => problems['paper.badTime']({ found })}
      onText={(text) => onValue(clockTime(text) ?? text.trim())}
    />
  );
}

interface MinutesProps {
  readonly label: string;
  readonly hint: string;
  readonly value: number | null;
  readonly onValue: (value: number | null) => void;
}

/** Minutes and seconds from the beginning of a part. */
function MinutesField({ value, onValue, ...rest }: MinutesProps) {
  const { paper, problems } = useWords();
  return (
    <TimeField
      {...rest}
      text={value === null ? '' : paper.clock({ ms: value })}
      tidy={(text) => (minutesAndSeconds(text) === null ? null : text)}
      wrong={(found) => problems['paper.noOnset']({ found })}
      onText={(text) => onValue(minutesAndSeconds(text))}
    />
  );
}

interface NumberProps {
  readonly label: string;
  readonly hint: string;
  readonly value: number | null;
  readonly most: number;
  readonly onValue: (value: number | null) => void;
}

function NumberField({ label, hint, value, most, onValue }: NumberProps) {
  const { words } = useServices();
  const wrong = value !== null && (value < 1 || value > most);
  return (
    <TextField
      label={label}
      hint={hint}
      inputMode="numeric"
      value={value === null ? '' : String(value)}
      problem={wrong ? words.problems['paper.stoppedNowhere']({ found: value, last: most }) : undefined}
      onChange={(event) => {
        const digits = event.target.value.replace(/\D/g, '').slice(0, 4);
        onValue(digits === '' ? null : Number(digits));
      }}
    />
  );
}
