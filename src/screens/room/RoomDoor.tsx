import { useState, useSyncExternalStore } from 'react';
import { useLocation } from 'wouter';
import { epochOf } from '../../kernel/wallTime.ts';
import { finishUnfinished, type SessionSummary } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { Dialog } from '../../ui/Dialog.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import type { Words } from '../../words/words.ts';
import { useServices } from '../services.ts';
import { useSettings } from '../useCurrentStudy.ts';
import { type Outlook, outlook } from './outlook.ts';

/** What can be done in the room now: go back in, take up what was cut off, or prepare. */
export function RoomDoor() {
  const { words, recorder, useStored } = useServices();
  const { room } = words;
  const settings = useSettings();
  const running = useSyncExternalStore(recorder.subscribe, recorder.currentId);
  const unfinished = useStored((store) => store.unfinishedSessions(), []);
  if (unfinished === undefined || settings === undefined)
    return <p className="second">{words.common.loading}</p>;
  if (!unfinished.ok) return <PageHead>{say(words.problems, unfinished.problem)}</PageHead>;
  const live = running === null ? null : recorder.current();
  if (live !== null && running !== null) {
    const { phase, state } = live.snapshot();
    return (
      <div className="stack">
        <PageHead
          about={room.doorAbout}
          {...(phase === 'ended' || phase === 'ready'
            ? {}
            : { note: room.doorRunningText({ klass: state.header.classroom.name }) })}
        >
          {phase === 'ended'
            ? room.doorOver
            : phase === 'ready'
              ? room.doorPrepared({ klass: state.header.classroom.name })
              : room.doorRunning}
        </PageHead>
        <div className="row">
          <a className="button button-main" href={`#/room/${running}`}>
            {phase === 'ready' ? room.doorGoIn : room.doorBack}
          </a>
        </div>
      </div>
    );
  }
  if (unfinished.value.length > 0)
    return (
      <div className="stack">
        <PageHead about={room.doorAbout}>{room.doorCutOff({ n: unfinished.value.length })}</PageHead>
        {unfinished.value.map((summary, i) => (
          <CutOff key={summary.id} summary={summary} first={i === 0} />
        ))}
      </div>
    );
  return (
    <div className="stack">
      <PageHead about={room.doorAbout} note={settings.prepared === null ? room.doorNothingText : undefined}>
        {settings.prepared === null
          ? room.doorNothing
          : room.doorPrepared({ klass: settings.prepared.classroom.name })}
      </PageHead>
      <div className="row">
        {settings.prepared === null ? (
          <a className="button button-main" href="#/before">
            {room.doorToBefore}
          </a>
        ) : (
          <a className="button button-main" href="#/before/ready">
            {room.doorToReady}
          </a>
        )}
      </div>
    </div>
  );
}

function CutOff({ summary, first }: { readonly summary: SessionSummary; readonly first: boolean }) {
  const { words, deps, device, useStored } = useServices();
  const { room, f } = words;
  const [, go] = useLocation();
  const [closing, setClosing] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const stored = useStored((store) => store.readSession(summary.id), [summary.id]);
  const ahead =
    stored?.ok && stored.value !== null ? outlook(stored.value, epochOf(device.now().wall)) : null;
  const observer = summary.observer.name;
  const close = async (): Promise<void> => {
    setClosing(false);
    if (await device.otherTabRecords()) {
      setProblem(words.problems['recorder.otherTabRecords']);
      return;
    }
    const closed = await finishUnfinished(deps, summary.id);
    if (!closed.ok) setProblem(say(words.problems, closed.problem));
  };
  const over = ahead?.goesOn.kind === 'nothing';
  const notBegun = summary.firstWall === null || ahead?.goesOn.kind === 'start';
  return (
    <Sheet title={summary.classroom.name}>
      <div className="stack-tight">
        <p>
          {notBegun || summary.firstWall === null
            ? room.doorNotBegun({ observer })
            : room.doorBegan({ observer, day: f.day(summary.firstWall), time: f.time(summary.firstWall) })}
        </p>
        {ahead !== null && <Ahead ahead={ahead} words={words} />}
        {problem !== null && <Notice kind="hold">{problem}</Notice>}
        <div className="row">
          {!over && (
            <Button look={first ? 'main' : 'plain'} onClick={() => go(`/room/${summary.id}`)}>
              {notBegun ? room.doorGoIn : room.doorTakeUp}
            </Button>
          )}
          <Button look={over && first ? 'main' : 'plain'} onClick={() => setClosing(true)}>
            {room.doorClose}
          </Button>
        </div>
      </div>
      {closing && (
        <Dialog
          title={room.doorCloseTitle}
          onClose={() => setClosing(false)}
          actions={
            <>
              <Button onClick={() => setClosing(false)}>{words.common.cancel}</Button>
              <Button look="main" onClick={close}>
                {room.doorCloseDo}
              </Button>
            </>
          }
        >
          <p>{room.doorCloseText}</p>
        </Dialog>
      )}
    </Sheet>
  );
}

function Ahead({ ahead, words: { room } }: { readonly ahead: Outlook; readonly words: Words }) {
  const { goesOn, scored, intervals, between, unit, time } = ahead;
  if (goesOn.kind === 'start') return <p>{room.doorStartsAt({ child: goesOn.child ?? '' })}</p>;
  return (
    <>
      <p>
        {time !== null
          ? room.doorKeptTime(time)
          : unit === 'scan'
            ? room.doorKeptScans({ kept: scored, of: intervals })
            : room.doorKept({ kept: scored, of: intervals })}
      </p>
      <p>
        {goesOn.kind === 'at'
          ? unit === 'scan'
            ? room.doorGoesOnScan({ number: goesOn.number, of: intervals })
            : room.doorGoesOnAt({ number: goesOn.number, child: goesOn.child ?? '', of: intervals })
          : goesOn.kind === 'within'
            ? room.doorGoesOnTime({ child: goesOn.child ?? '', left: goesOn.left })
            : goesOn.kind === 'paused'
              ? room.doorPausedAt({ number: goesOn.number })
              : goesOn.kind === 'part'
                ? room.doorGoesOnWith({ phase: goesOn.phase })
                : room.doorTimeOver}
      </p>
      <p className="second">
        {time === null ? room.doorBetween({ n: between }) : room.doorBetweenTime({ ms: time.lost })}
      </p>
    </>
  );
}
