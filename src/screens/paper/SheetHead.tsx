import type { VisitPlan } from '../../model/visitPlan.ts';
import { useWords } from '../services.ts';
import { methodSentence } from '../study/methodSentence.ts';
import type { PaperSheet } from './paperLayout.ts';
import { howTo } from './paperTexts.ts';
import { StandInLines } from './StandInLines.tsx';

interface Props {
  readonly plan: VisitPlan;
  readonly label: string;
  readonly page: number;
  readonly of: number;
}

/** Head of the first page: what the sheet is, and what is to be filled in once. */
export function SheetHead({ plan, label, page, of, sheet }: Props & { readonly sheet: PaperSheet }) {
  const { paper, ...words } = useWords();
  const { protocol, phases } = plan.schedule;
  const { name, version } = protocol;
  const method = methodSentence({ paper, ...words }, protocol);
  return (
    <header className="paper-head" style={{ height: `${sheet.headHeight}mm` }}>
      <TopLine {...{ plan, label, page, of }} title />
      <p className="paper-clip">{paper.protocolLine({ name, version, method })}</p>
      <p className="paper-strong paper-clip">{howTo({ paper, ...words }, protocol, sheet.form)}</p>
      <div className="paper-fields">
        <Blank label={paper.dateField} wide={3} />
        <Blank label={paper.observerField} wide={4} />
        <Blank label={paper.startField} wide={3} clock />
      </div>
      {phases.slice(1).map((phase) => (
        <div className="paper-fields" key={phase}>
          <Blank label={paper.breakField({ phase })} wide={1} clock />
          <Blank label={paper.firstTaskField({ phase })} wide={1} clock />
        </div>
      ))}
      <div className="paper-roles">
        {[paper.alone, paper.primary, paper.second].map((role) => (
          <span key={role}>
            <i className="paper-tick" /> {role}
          </span>
        ))}
        {protocol.method === 'duration' ? (
          <Blank label={paper.stoppedAtField} wide={1} clock />
        ) : (
          <Blank label={paper.stoppedField} wide={1} />
        )}
      </div>
      {sheet.standIns !== null && <StandInLines plan={plan} {...sheet.standIns} />}
      <p className="paper-caution">{paper.cautions}</p>
    </header>
  );
}

/** Head of every further page. */
export function SheetHeadAgain(props: Props) {
  const { paper } = useWords();
  return (
    <header className="paper-head paper-head-again">
      <TopLine {...props} />
      <div className="paper-fields">
        <Blank label={paper.dateField} wide={3} />
        <Blank label={paper.observerField} wide={5} />
      </div>
    </header>
  );
}

function TopLine({ plan, label, page, of, title = false }: Props & { readonly title?: boolean }) {
  const { paper } = useWords();
  const text = paper.sheetTitle({ klass: plan.classroom.name });
  return (
    <div className="paper-top">
      {title ? <h2 className="paper-clip">{text}</h2> : <strong className="paper-clip">{text}</strong>}
      <span className="paper-label">
        <strong>{paper.label({ label })}</strong> · {paper.pageOf({ page, of })}
      </span>
    </div>
  );
}

function Blank({
  label,
  wide,
  clock = false,
}: {
  readonly label: string;
  readonly wide: number;
  readonly clock?: boolean;
}) {
  return (
    <span className="paper-blank" style={{ flexGrow: wide }}>
      <span className="paper-clip">{label}</span>
      <i>{clock && <b>:</b>}</i>
    </span>
  );
}
