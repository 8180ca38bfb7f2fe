import { type FormEvent, type ReactNode, useState } from 'react';
import type { Result } from '../../kernel/result.ts';
import type { VisitPlan } from '../../model/visitPlan.ts';
import { sheetLabel } from '../../schedule/sheetLabel.ts';
import {
  beginPaper,
  findSheet,
  type SessionSummary,
  type Settings,
  visitOfSession,
} from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { TextField } from '../../ui/Field.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import { useServices, useWords } from '../services.ts';
import { useCurrentStudy } from '../useCurrentStudy.ts';

/** Whose schedule the sheet has: the label on it says so, or a list of what this tablet knows. */
export function ChooseSheet({ settings }: { readonly settings: Settings }) {
  const { words, deps, useStored } = useServices();
  const { paper } = words;
  const study = useCurrentStudy();
  const listed = useStored(
    (store) => (study ? store.listSessions(study.id) : Promise.resolve({ ok: true as const, value: [] })),
    [study?.id],
  );
  const [label, setLabel] = useState('');
  const [problem, setProblem] = useState<string | null>(null);
  const begin = async (found: Promise<Result<VisitPlan>>) => {
    const plan = await found;
    const begun = plan.ok ? await beginPaper(deps, plan.value) : plan;
    setProblem(begun.ok ? null : say(words.problems, begun.problem));
  };
  const find = (event: FormEvent) => {
    event.preventDefault();
    if (label.trim() !== '') void begin(findSheet(deps, study?.id ?? '', label));
  };
  const take = (plan: VisitPlan) => () => void begin(Promise.resolve({ ok: true, value: plan }));
  const { prepared } = settings;
  const printed = settings.sheets.filter(
    (plan) => prepared === null || sheetLabel(plan) !== sheetLabel(prepared),
  );
  const visits = visitsOf(listed?.ok ? listed.value : []);
  const nothing = prepared === null && printed.length === 0 && visits.length === 0;
  return (
    <div className="stack">
      <PageHead note={paper.chooseNote}>{paper.chooseTitle}</PageHead>
      <form className="row typing-find" onSubmit={find}>
        <TextField
          label={paper.findLabel}
          value={label}
          autoCapitalize="characters"
          onChange={(event) => setLabel(event.target.value)}
        />
        <Button type="submit" disabled={label.trim() === ''}>
          {paper.find}
        </Button>
      </form>
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
      {nothing && (
        <div className="row">
          <p className="grow second">{paper.nothingToType}</p>
          <a className="button" href="#/before">
            {paper.toPrepare}
          </a>
        </div>
      )}
      {prepared !== null && (
        <List title={paper.prepared}>
          <Line
            text={paper.visitLine({ klass: prepared.classroom.name, label: sheetLabel(prepared) })}
            onType={take(prepared)}
          />
        </List>
      )}
      {printed.length > 0 && (
        <List title={paper.printed}>
          {printed.map((plan) => (
            <Line
              key={sheetLabel(plan)}
              text={paper.visitLine({ klass: plan.classroom.name, label: sheetLabel(plan) })}
              onType={take(plan)}
            />
          ))}
        </List>
      )}
      {visits.length > 0 && (
        <List title={paper.recorded} hint={paper.recordedHint}>
          {visits.map((own) => (
            <Line
              key={own[0].visit}
              text={paper.recordLine({
                klass: own[0].classroom.name,
                date: own[0].date,
                observers: own.map(({ observer }) => observer.name),
              })}
              onType={() => void begin(visitOfSession(deps, own[0].id))}
            />
          ))}
        </List>
      )}
    </div>
  );
}

function Line({ text, onType }: { readonly text: string; readonly onType: () => void }) {
  const { paper } = useWords();
  return (
    <li>
      <span className="grow">{text}</span>
      <Button onClick={onType} aria-label={`${paper.typeThis}: ${text}`}>
        {paper.typeThis}
      </Button>
    </li>
  );
}

function List({
  title,
  hint,
  children,
}: {
  readonly title: string;
  readonly hint?: string;
  readonly children: ReactNode;
}) {
  return (
    <Sheet title={title} flush>
      {hint !== undefined && <p className="second small typing-hint">{hint}</p>}
      <ul className="lines">{children}</ul>
    </Sheet>
  );
}

/** Visits that were recorded with a schedule, newest first, each with its records. */
function visitsOf(sessions: readonly SessionSummary[]): [SessionSummary, ...SessionSummary[]][] {
  const visits = new Map<string, [SessionSummary, ...SessionSummary[]]>();
  for (const session of sessions) {
    if (session.protocol === null) continue;
    const known = visits.get(session.visit);
    if (known === undefined) visits.set(session.visit, [session]);
    else known.push(session);
  }
  return [...visits.values()].reverse();
}
