import { resumeCandidates } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { useServices } from '../services.ts';
import { useSettings } from '../useCurrentStudy.ts';

/** A recording that was cut off comes before everything else. */
export function UnfinishedNotice() {
  const { words, deps, useStored } = useServices();
  const answer = useStored(() => resumeCandidates(deps), []);
  const first = answer?.ok ? answer.value[0] : undefined;
  if (first === undefined) return null;
  return (
    <Notice
      kind="hold"
      actions={
        <a className="button" href="#/room">
          {words.before.unfinishedGo}
        </a>
      }
    >
      {words.before.unfinished({ klass: first.classroom.name, time: words.f.time(first.firstWall ?? '') })}
    </Notice>
  );
}

/** A visit that was prepared and not recorded yet. */
export function PreparedNotice() {
  const { words, store } = useServices();
  const prepared = useSettings()?.prepared ?? null;
  if (prepared === null) return null;
  return (
    <Notice
      kind="done"
      actions={
        <>
          <Button look="quiet" onClick={() => store.saveSettings({ prepared: null })}>
            {words.before.preparedForget}
          </Button>
          <a className="button" href="#/before/ready">
            {words.before.preparedGo}
          </a>
        </>
      }
    >
      {words.before.preparedAbout({ klass: prepared.classroom.name, children: prepared.children.length })}
    </Notice>
  );
}
