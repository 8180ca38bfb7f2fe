import { useState } from 'react';
import { useLocation } from 'wouter';
import type { VisitPlan } from '../../../model/visitPlan.ts';
import { adoptVisit } from '../../../tasks/readCard.ts';
import { Button } from '../../../ui/Button.tsx';
import { Notice } from '../../../ui/Notice.tsx';
import { PageHead } from '../../../ui/PageHead.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { say } from '../../../words/say.ts';
import { useServices } from '../../services.ts';
import { useSettings } from '../../useCurrentStudy.ts';
import { visitSaid } from './visitSaid.ts';

interface Props {
  readonly plan: VisitPlan;
  readonly onLeave: () => void;
}

/** What was read, in a sentence, before anything of it is kept. */
export function TakeOver({ plan, onLeave }: Props) {
  const { words, deps, store } = useServices();
  const [, go] = useLocation();
  const other = useSettings()?.prepared ?? null;
  const [problem, setProblem] = useState<string | null>(null);
  const take = async () => {
    const adopted = await adoptVisit(deps, plan);
    if (!adopted.ok) return setProblem(say(words.problems, adopted.problem));
    const kept = await store.saveSettings({ prepared: adopted.value, study: adopted.value.study.id });
    if (!kept.ok) return setProblem(say(words.problems, kept.problem));
    go('/before/ready/second');
  };
  return (
    <div className="stack">
      <PageHead about={plan.study.name}>{words.pairing.previewTitle}</PageHead>
      <Sheet>
        <p>{words.pairing.preview(visitSaid(plan))}</p>
        {other !== null && other.visit !== plan.visit && (
          <p className="second">{words.pairing.replaces({ klass: other.classroom.name })}</p>
        )}
      </Sheet>
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
      <div className="row">
        <Button look="main" onClick={take}>
          {words.pairing.take}
        </Button>
        <Button look="quiet" onClick={onLeave}>
          {words.pairing.leave}
        </Button>
      </div>
    </div>
  );
}
