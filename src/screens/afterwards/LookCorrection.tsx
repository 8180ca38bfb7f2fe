import { useId, useState } from 'react';
import type { RoundSheet } from '../../analysis/index.ts';
import { recordingFacts } from '../../journal/headerFacts.ts';
import type { StoredSession } from '../../journal/stored.ts';
import { type MissingReason, missingReasons } from '../../model/missing.ts';
import { amendInterval } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Check } from '../../ui/Choice.tsx';
import { SelectField, TextField } from '../../ui/Field.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';
import { useCellText } from './useCellText.ts';

interface Props {
  readonly session: StoredSession;
  readonly sheets: readonly RoundSheet[];
}

/** Corrects a look after the session: what it should be, why, and who says so. The mark stays in the journal. */
export function LookCorrection({ session: { header }, sheets }: Props) {
  const { words, deps, useStored } = useServices();
  const cellText = useCellText();
  const listId = useId();
  const [open, setOpen] = useState(false);
  const [child, setChild] = useState('');
  const [interval, setInterval_] = useState('');
  const [codes, setCodes] = useState<readonly string[]>([]);
  const [to, setTo] = useState('');
  const [on, setOn] = useState('');
  const [present, setPresent] = useState('');
  const [why, setWhy] = useState('');
  const [by, setBy] = useState('');
  const [said, setSaid] = useState<{ readonly done: boolean; readonly text: string } | null>(null);
  const observers = useStored((store) => store.observers(header.study), [header.study]);
  const { codeSet, method } = recordingFacts(header);
  if (method === 'duration') return header.schedule.kind === 'laid' ? <NotForDurations /> : null;
  const scans = method === 'headcount';
  const several = method === 'partial' || method === 'whole';
  const children = [...new Set(sheets.flatMap((sheet) => sheet.rows.map((row) => row.child ?? '')))];
  const looks = sheets.flatMap((sheet) =>
    sheet.rows
      .filter((row) => (row.child ?? '') === child)
      .flatMap((row) =>
        row.cells.flatMap((cell, k) =>
          cell === null
            ? []
            : [{ number: cell.number, phase: sheet.phase, k: k + 1, was: cellText(cell.mark) }],
        ),
      ),
  );
  const counts = scans && to === '' ? countsOf(on, present) : null;
  const answered = scans ? to !== '' || counts !== null : several || to !== '';
  const complete = interval !== '' && answered && why.trim() !== '' && by.trim() !== '';
  const keep = async () => {
    if (!complete) return setSaid({ done: false, text: words.afterwards.correctNeeds });
    const reason = missingReasons.find((one) => `missing ${one}` === to) ?? null;
    const kept = await amendInterval(deps, header.id, {
      interval: Number(interval),
      codes: reason !== null ? null : scans ? [] : several ? codes : [to],
      ...(counts === null ? {} : { counts }),
      missing: reason as MissingReason | null,
      why: why.trim(),
      by: by.trim(),
    });
    if (!kept.ok) return setSaid({ done: false, text: say(words.problems, kept.problem) });
    setSaid({ done: true, text: words.afterwards.correctKept });
    setInterval_('');
    setTo('');
    setCodes([]);
    setOn('');
    setPresent('');
    setWhy('');
  };
  return (
    <Sheet
      title={scans ? words.afterwards.correctScanTitle : words.afterwards.correctTitle}
      className="not-in-print"
    >
      <div className="stack-tight">
        <div className="row">
          <p className="grow second">
            {scans ? words.afterwards.correctScanText : words.afterwards.correctText}
          </p>
          {!open && (
            <Button onClick={() => setOpen(true)}>
              {scans ? words.afterwards.correctScanOpen : words.afterwards.correctOpen}
            </Button>
          )}
        </div>
        {said !== null && <Notice kind={said.done ? 'done' : 'hold'}>{said.text}</Notice>}
        {open && (
          <form
            className="stack-tight"
            onSubmit={(event) => {
              event.preventDefault();
              keep();
            }}
          >
            <div className="columns">
              {!scans && (
                <SelectField
                  label={words.afterwards.correctChild}
                  value={child}
                  onChange={(event) => {
                    setChild(event.target.value);
                    setInterval_('');
                  }}
                >
                  <option value="">{words.afterwards.choose}</option>
                  {children.map((name) => (
                    <option key={name}>{name}</option>
                  ))}
                </SelectField>
              )}
              <SelectField
                label={scans ? words.afterwards.correctWhichScan : words.afterwards.correctWhich}
                value={interval}
                disabled={!scans && child === ''}
                onChange={(event) => setInterval_(event.target.value)}
              >
                <option value="">{words.afterwards.choose}</option>
                {looks.map(({ number, ...look }) => (
                  <option key={number} value={number}>
                    {scans ? words.afterwards.correctScan(look) : words.afterwards.correctLook(look)}
                  </option>
                ))}
              </SelectField>
            </div>
            {scans && (
              <div className="columns">
                <TextField
                  label={words.afterwards.correctOn}
                  inputMode="numeric"
                  value={on}
                  disabled={to !== ''}
                  onChange={(event) => setOn(event.target.value)}
                />
                <TextField
                  label={words.afterwards.correctPresent}
                  inputMode="numeric"
                  value={present}
                  disabled={to !== ''}
                  onChange={(event) => setPresent(event.target.value)}
                />
              </div>
            )}
            {several && (
              <fieldset className="choice">
                <legend className="choice-legend">{words.afterwards.correctTo}</legend>
                <div className="choice-options">
                  {codeSet.codes.map((code) => (
                    <Check
                      key={code.id}
                      label={code.label}
                      checked={codes.includes(code.id)}
                      disabled={to !== ''}
                      onChange={(yes) =>
                        setCodes((before) =>
                          yes ? [...before, code.id] : before.filter((id) => id !== code.id),
                        )
                      }
                    />
                  ))}
                </div>
              </fieldset>
            )}
            <div className="columns">
              <SelectField
                label={words.afterwards.correctTo}
                value={to}
                onChange={(event) => setTo(event.target.value)}
              >
                <option value="">{words.afterwards.choose}</option>
                {!several &&
                  !scans &&
                  codeSet.codes.map((code) => (
                    <option key={code.id} value={code.id}>
                      {code.label}
                    </option>
                  ))}
                {missingReasons.map((reason) => (
                  <option key={reason} value={`missing ${reason}`}>
                    {words.afterwards.correctMissing({ reason: words.missing[reason] })}
                  </option>
                ))}
              </SelectField>
              <TextField
                label={words.afterwards.correctBy}
                value={by}
                list={listId}
                onChange={(event) => setBy(event.target.value)}
              />
              <datalist id={listId}>
                {(observers?.ok ? observers.value : []).map((one) => (
                  <option key={one.id} value={one.name} />
                ))}
              </datalist>
            </div>
            <TextField
              label={words.afterwards.correctWhy}
              hint={words.afterwards.correctWhyHint}
              value={why}
              onChange={(event) => setWhy(event.target.value)}
            />
            <div className="row">
              <Button look="main" type="submit">
                {words.afterwards.correctKeep}
              </Button>
              <Button look="quiet" onClick={() => setOpen(false)}>
                {words.common.close}
              </Button>
            </div>
          </form>
        )}
      </div>
    </Sheet>
  );
}

/** Two whole numbers, or null as long as both are not there; whether they fit is for the task to say. */
function countsOf(on: string, present: string): { readonly on: number; readonly present: number } | null {
  const [onTask, there] = [on.trim(), present.trim()];
  return onTask === '' || there === '' ? null : { on: Number(onTask), present: Number(there) };
}

/** A recorded duration has no looks that could be corrected one by one. */
function NotForDurations() {
  const { words } = useServices();
  return (
    <Sheet title={words.afterwards.correctTitle} className="not-in-print">
      <p className="second">{words.afterwards.correctNoDuration}</p>
    </Sheet>
  );
}
