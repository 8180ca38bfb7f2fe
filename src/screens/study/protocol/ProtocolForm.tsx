import { useRef, useState } from 'react';
import { useLocation } from 'wouter';
import { looksAtEverybody, watchesOne } from '../../../schedule/orderOfDay.ts';
import { type ProtocolDraft, removeProtocol, saveProtocol } from '../../../tasks/index.ts';
import { restoreProtocol } from '../../../tasks/restore.ts';
import { Button } from '../../../ui/Button.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { Sheet } from '../../../ui/Sheet.tsx';
import { useServices } from '../../services.ts';
import { useFarewell } from '../farewell.ts';
import { useDoing } from '../useDoing.tsx';
import { CodesSheet } from './CodesSheet.tsx';
import { CuesSheet } from './CuesSheet.tsx';
import type { Change } from './change.ts';
import { Meaning } from './Meaning.tsx';
import { MethodFields } from './MethodFields.tsx';
import { SchedulePreview } from './SchedulePreview.tsx';
import { WhomFields } from './WhomFields.tsx';
import './protocol.css';

interface Props {
  readonly first: ProtocolDraft;
  /** The version as which changes will be kept; null for a new protocol. */
  readonly nextVersion: number | null;
}

/** The recipe of an observation: it says at once what it comes to, and is kept by one button. */
export function ProtocolForm({ first, nextVersion }: Props) {
  const { words, deps } = useServices();
  const { study } = words;
  const [, go] = useLocation();
  const farewell = useFarewell();
  const { run, tell, hold, notice, busy } = useDoing();
  const [draft, setDraft] = useState(first);
  const form = useRef<HTMLFormElement>(null);
  const change: Change = (changes) => setDraft((standing) => ({ ...standing, ...changes }));
  const save = async () => {
    // Fields keep what does not fit; only what fits has reached the draft.
    if (form.current?.querySelector('[aria-invalid]')) return hold(study.lookOver);
    const kept = await run(saveProtocol(deps, draft));
    if (!kept.ok) return;
    const said = study.protocolKept({ name: kept.value.name, version: kept.value.version });
    if (draft.id !== null) return tell(said);
    farewell.tell(said, () => removeProtocol(deps, kept.value.id));
    go('/study');
  };
  const remove = async (id: string) => {
    const removed = await run(removeProtocol(deps, id));
    if (!removed.ok) return;
    farewell.tell(study.protocolRemoved({ name: draft.name }), () => restoreProtocol(deps, id));
    go('/study');
  };
  return (
    <form
      ref={form}
      className="recipe"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void save();
      }}
    >
      <div className="stack">
        <Sheet title={study.howToWatch}>
          <div className="stack">
            <TextField
              label={study.protocolName}
              maxLength={200}
              value={draft.name}
              onChange={(event) => change({ name: event.target.value })}
            />
            <MethodFields draft={draft} change={change} />
          </div>
        </Sheet>
        <Sheet title={study.whom}>
          <WhomFields draft={draft} change={change} />
        </Sheet>
      </div>
      <div className="recipe-means">
        <Meaning draft={draft} />
        <SchedulePreview draft={draft} />
      </div>
      <div className="stack recipe-rest">
        <CodesSheet set={draft.codeSet} onChange={(codeSet) => change({ codeSet })} />
        <CuesSheet
          cues={draft.cues}
          headsUpWithinMs={looksAtEverybody(draft) || watchesOne(draft) ? null : draft.intervalMs}
          onChange={(cues) => change({ cues })}
        />
        {notice}
        <div className="row">
          <Button type="submit" look="main" disabled={busy}>
            {nextVersion === null ? study.saveProtocol : study.saveNewVersion({ version: nextVersion })}
          </Button>
          {draft.id !== null && (
            <Button look="quiet" disabled={busy} onClick={() => draft.id !== null && remove(draft.id)}>
              {study.removeProtocol}
            </Button>
          )}
        </div>
      </div>
    </form>
  );
}
