import { useMemo, useState } from 'react';
import type { VisitPlan } from '../../model/visitPlan.ts';
import { sheetLabel } from '../../schedule/sheetLabel.ts';
import { keepSheet, visitOfSession } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Choice } from '../../ui/Choice.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { say } from '../../words/say.ts';
import { useServices, useWords } from '../services.ts';
import { useAnswer } from '../useAnswer.ts';
import { useSettings } from '../useCurrentStudy.ts';
import { PaperPages } from './PaperPages.tsx';
import { hasRounds, type PaperForm, type PaperSize, paperLayout } from './paperLayout.ts';
import { boxNumbers, legendOf } from './paperTexts.ts';

/** The schedule as a form for pencil: of the prepared visit, or of a session (whose tablet broke, or which a second observer checks). */
export function SheetPage({ session }: { readonly session: string | null }) {
  return session === null ? <OfPrepared /> : <OfSession session={session} />;
}

function OfPrepared() {
  const words = useWords();
  const settings = useSettings();
  if (settings === undefined) return <p className="second">{words.common.loading}</p>;
  if (settings.prepared === null)
    return (
      <>
        <PageHead>{words.paper.nothing}</PageHead>
        <div className="row">
          <a className="button" href="#/before">
            {words.paper.toPrepare}
          </a>
          <a className="button" href="#/before/paper/type">
            {words.paper.typeLink}
          </a>
        </div>
      </>
    );
  return <Sheets plan={settings.prepared} back={{ href: '#/before/ready', text: words.paper.toReady }} />;
}

function OfSession({ session }: { readonly session: string }) {
  const { words, deps } = useServices();
  const pending = useAnswer(() => visitOfSession(deps, session), session);
  if (pending.state === 'working') return <p className="second">{words.common.loading}</p>;
  const { answer } = pending;
  const back = { href: `#/afterwards/session/${encodeURIComponent(session)}`, text: words.paper.toSession };
  if (!answer.ok)
    return (
      <>
        <PageHead>{say(words.problems, answer.problem)}</PageHead>
        <a className="button" href={back.href}>
          {back.text}
        </a>
      </>
    );
  return <Sheets plan={answer.value} back={back} />;
}

interface Props {
  readonly plan: VisitPlan;
  readonly back: { readonly href: string; readonly text: string };
}

function Sheets({ plan, back }: Props) {
  const { words, deps, device } = useServices();
  const { paper } = words;
  // Where inches are used, so is Letter; anybody may choose.
  const [size, setSize] = useState<PaperSize>('A4');
  const [form, setForm] = useState<PaperForm>('rows');
  const [problem, setProblem] = useState<string | null>(null);
  const rounds = hasRounds(plan, size);
  const shape = rounds ? form : 'rows';
  const { protocol } = plan.schedule;
  const sheet = useMemo(
    () =>
      paperLayout(plan, {
        size,
        form: shape,
        legend: legendOf(words, plan),
        boxesPerRow: protocol.method === 'headcount' ? 3 : boxNumbers(protocol).length,
      }),
    [plan, size, shape, words, protocol],
  );
  const print = async () => {
    const kept = await keepSheet(deps, plan);
    setProblem(kept.ok ? null : say(words.problems, kept.problem));
    device.print();
  };
  return (
    <div className="stack paper-stack">
      <div className="not-in-print">
        <PageHead
          about={paper.about({ klass: plan.classroom.name, label: sheetLabel(plan) })}
          note={paper.note}
        >
          {paper.title}
        </PageHead>
        <div className="stack">
          <div className="columns">
            <Choice
              legend={paper.size}
              value={size}
              onChange={setSize}
              options={[
                { value: 'A4', label: paper.sizeA4 },
                { value: 'Letter', label: paper.sizeLetter },
              ]}
            />
            {rounds && (
              <Choice
                legend={paper.form}
                value={form}
                onChange={setForm}
                options={[
                  { value: 'rows', label: paper.formRows, hint: paper.formRowsHint },
                  { value: 'rounds', label: paper.formRounds, hint: paper.formRoundsHint },
                ]}
              />
            )}
          </div>
          {problem !== null && <Notice kind="hold">{problem}</Notice>}
          <div className="row">
            <Button look="main" onClick={print}>
              {paper.print}
            </Button>
            <span className="second small">{paper.printHint({ pages: sheet.pages.length })}</span>
            <a className="button" href="#/before/paper/type">
              {paper.typeLink}
            </a>
            <a className="button" href={back.href}>
              {back.text}
            </a>
          </div>
        </div>
      </div>
      <PaperPages plan={plan} size={size} sheet={sheet} />
    </div>
  );
}
