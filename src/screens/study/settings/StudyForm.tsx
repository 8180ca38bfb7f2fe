import { useRef, useState } from 'react';
import type { Study } from '../../../model/study.ts';
import { type StudySettings, saveStudy } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { SelectField, TextArea, TextField } from '../../../ui/Field.tsx';
import { useServices } from '../../services.ts';
import { NumberField } from '../NumberField.tsx';
import { useDoing } from '../useDoing.tsx';

const lines = (text: string): string[] => text.split('\n').filter((line) => line.trim() !== '');
const settingsOf = (study: Study): StudySettings => ({
  name: study.name,
  phases: study.phases,
  conditions: study.conditions,
  control: study.control,
  lessonParts: study.lessonParts,
  criterion: study.criterion,
  safeguarding: study.safeguarding,
});

/** The study's own words, its criterion and its safeguarding contact. */
export function StudyForm({ study }: { readonly study: Study }) {
  const { words, deps } = useServices();
  const w = words.study;
  const { run, tell, hold, notice, busy } = useDoing();
  const form = useRef<HTMLFormElement>(null);
  const [name, setName] = useState(study.name);
  const [phases, setPhases] = useState(study.phases.join('\n'));
  const [conditions, setConditions] = useState(study.conditions.join('\n'));
  const [lessonParts, setLessonParts] = useState(study.lessonParts.join('\n'));
  const [control, setControl] = useState(study.control);
  const [criterion, setCriterion] = useState(study.criterion);
  const [safeguarding, setSafeguarding] = useState(study.safeguarding);
  const show = (next: Study) => {
    setName(next.name);
    setPhases(next.phases.join('\n'));
    setConditions(next.conditions.join('\n'));
    setLessonParts(next.lessonParts.join('\n'));
    setControl(next.control);
    setCriterion(next.criterion);
    setSafeguarding(next.safeguarding);
  };
  const choices = lines(conditions);
  const save = async () => {
    if (form.current?.querySelector('[aria-invalid]')) return hold(w.lookOver);
    const standing = settingsOf(study);
    const kept = await run(
      saveStudy(deps, study.id, {
        name,
        phases: lines(phases),
        conditions: choices,
        lessonParts: lines(lessonParts),
        control,
        criterion,
        safeguarding: safeguarding.trim(),
      }),
    );
    if (!kept.ok) return;
    show(kept.value);
    tell(w.settingsKept, async () => {
      const back = await saveStudy(deps, study.id, standing);
      if (back.ok) show(back.value);
      return back;
    });
  };
  return (
    <form
      ref={form}
      className="stack"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void save();
      }}
    >
      <p className="second">{w.wordsNote}</p>
      <TextField label={w.ownName} maxLength={200} value={name} onChange={(e) => setName(e.target.value)} />
      <div className="columns">
        <TextArea label={w.phases} value={phases} onChange={(e) => setPhases(e.target.value)} />
        <TextArea label={w.conditions} value={conditions} onChange={(e) => setConditions(e.target.value)} />
        <SelectField
          label={w.control}
          hint={w.controlHint}
          value={control === null ? '' : control}
          onChange={(e) => setControl(e.target.value === '' ? null : e.target.value)}
        >
          <option value="">{w.controlNone}</option>
          {[...new Set(control === null ? choices : [...choices, control])].map((one) => (
            <option key={one} value={one}>
              {one}
            </option>
          ))}
        </SelectField>
        <TextArea
          label={w.lessonParts}
          value={lessonParts}
          onChange={(e) => setLessonParts(e.target.value)}
        />
      </div>
      <div className="stack-tight">
        <h3>{w.criterion}</h3>
        <p className="second">{w.criterionNote}</p>
        <div className="columns">
          <NumberField
            label={w.criterionAgreement}
            min={0}
            max={100}
            value={Math.round(criterion.agreement * 100)}
            onValue={(percent) => setCriterion({ ...criterion, agreement: percent / 100 })}
          />
          <NumberField
            label={w.criterionKappa}
            min={0}
            max={1}
            step={0.01}
            value={criterion.kappa}
            onValue={(kappa) => setCriterion({ ...criterion, kappa })}
          />
        </div>
      </div>
      <TextField
        label={w.safeguarding}
        hint={w.safeguardingHint}
        maxLength={10_000}
        value={safeguarding}
        onChange={(e) => setSafeguarding(e.target.value)}
      />
      {notice}
      <div className="row">
        <Button type="submit" look="main" disabled={busy}>
          {w.saveSettings}
        </Button>
      </div>
    </form>
  );
}
