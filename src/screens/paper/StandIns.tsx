import { type FormEvent, useRef, useState } from 'react';
import type { AwayReason } from '../../journal/entry.ts';
import type { ScheduledInterval } from '../../schedule/layOut.ts';
import { awayReasons, type PaperStandIn, standInsFault } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { SelectField, TextField } from '../../ui/Field.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';
import { awayNumber } from './paperTexts.ts';
import type { Typing } from './useTyping.ts';

interface Props {
  readonly typing: Typing;
  readonly intervals: readonly ScheduledInterval[];
}

const nothing = { child: '', reason: '', by: '', from: '', until: '' };

/** Who was away and which reserve was watched instead, as the sheet's own lines say it. */
export function StandIns({ typing, intervals }: Props) {
  const { words } = useServices();
  const { paper } = words;
  const { plan, standIns = [] } = typing.draft;
  const { protocol } = plan.schedule;
  const [typed, setTyped] = useState(nothing);
  const [problem, setProblem] = useState<string | null>(null);
  const form = useRef<HTMLFormElement>(null);
  const reserves = plan.reserves ?? [];
  const standing = new Set(standIns.map(({ by }) => by));
  const watched = [...plan.children, ...reserves.filter(({ id }) => standing.has(id))];
  const nameOf = (id: string): string =>
    [...plan.children, ...reserves].find((one) => one.id === id)?.pseudonym ?? id;
  const put = (next: readonly PaperStandIn[]) => typing.change({ standIns: next });
  const add = (event: FormEvent) => {
    event.preventDefault();
    const { child, reason, by, from, until } = typed;
    if (child === '' || reason === '' || by === '' || from.trim() === '')
      return setProblem(paper.standInWhole);
    const next = [
      ...standIns,
      {
        child,
        reason: reason as AwayReason,
        by,
        from: Number(from),
        until: until.trim() === '' ? null : Number(until),
      },
    ];
    const fault = standInsFault({ ...typing.draft, standIns: next }, intervals);
    if (fault !== null) return setProblem(say(words.problems, fault.problem));
    put(next);
    setTyped(nothing);
    setProblem(null);
    form.current?.querySelector('select')?.focus();
  };
  const select = (
    name: 'child' | 'reason' | 'by',
    label: string,
    options: readonly (readonly [string, string])[],
  ) => (
    <SelectField
      label={label}
      value={typed[name]}
      onChange={(event) => setTyped({ ...typed, [name]: event.target.value })}
    >
      <option value="">{paper.onsetChoose}</option>
      {options.map(([value, text]) => (
        <option key={value} value={value}>
          {text}
        </option>
      ))}
    </SelectField>
  );
  const line = (name: 'from' | 'until', label: string) => (
    <TextField
      label={label}
      inputMode="numeric"
      value={typed[name]}
      onChange={(event) => setTyped({ ...typed, [name]: event.target.value.replace(/\D/g, '').slice(0, 4) })}
    />
  );
  return (
    <div className="stack-tight">
      <p className="second">{paper.standInNote}</p>
      <form ref={form} className="typing-fields" onSubmit={add}>
        {select(
          'child',
          paper.standInChild,
          watched.map(({ id, pseudonym }) => [id, pseudonym]),
        )}
        {select(
          'reason',
          paper.standInReason,
          awayReasons.map((reason) => [
            reason,
            paper.numbered({ number: awayNumber(protocol, reason), text: words.missing[reason] }),
          ]),
        )}
        {line('from', paper.standInFrom)}
        {select(
          'by',
          paper.standInBy,
          reserves.map(({ id, pseudonym }) => [id, pseudonym]),
        )}
        {line('until', paper.standInUntil)}
        <Button type="submit">{paper.addLine}</Button>
      </form>
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
      <ul className="lines">
        {[...standIns]
          .sort((a, b) => a.from - b.from)
          .map((one) => {
            const { child, reason, by, from, until } = one;
            const said = { by: nameOf(by), child: nameOf(child), reason: words.missing[reason], from, until };
            return (
              <li key={`${child} ${from}`}>
                <span className="grow">{paper.standInSaid(said)}</span>
                <Button
                  look="quiet"
                  aria-label={paper.standInRemove({ by: nameOf(by), from })}
                  onClick={() => put(standIns.filter((other) => other !== one))}
                >
                  {words.common.remove}
                </Button>
              </li>
            );
          })}
      </ul>
    </div>
  );
}
