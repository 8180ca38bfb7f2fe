import { useEffect, useState } from 'react';
import { exportStudy, exportTable } from '../../tasks/index.ts';
import { PageHead } from '../../ui/PageHead.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import type { Device } from '../services.ts';
import { useServices } from '../services.ts';
import { useCurrentStudy, useSettings } from '../useCurrentStudy.ts';
import { BringIn } from './BringIn.tsx';
import { HandOut } from './HandOut.tsx';
import { TakeVisit } from './TakeVisit.tsx';
import { useWaiting } from './useWaiting.ts';
import './files.css';

/** Files: what leaves the tablet, what comes in, and what is kept where. */
export function Files() {
  const { words, deps } = useServices();
  const study = useCurrentStudy();
  const settings = useSettings();
  const waiting = useWaiting(study?.id);
  if (study === undefined || settings === undefined || waiting === undefined)
    return <p className="second">{words.common.loading}</p>;
  const title =
    waiting.recorded === 0 ? words.files.emptyTitle : words.files.title({ waiting: waiting.sessions });
  return (
    <div className="stack">
      <PageHead about={study?.name} note={words.files.note}>
        {title}
      </PageHead>
      <Sheet title={words.files.out}>
        {study === null ? (
          <p className="second">{words.files.noStudy}</p>
        ) : (
          <div className="stack">
            <div className="stack-tight">
              <h3>{words.files.studyFile}</h3>
              <p className="second">{words.files.studyFileText}</p>
              <p className="small">
                {settings.lastBackup === null
                  ? words.files.neverBackedUp
                  : words.files.lastBackup({ wall: settings.lastBackup })}
              </p>
              <div>
                <HandOut make={() => exportStudy(deps, study.id)}>{words.files.studyFileMake}</HandOut>
              </div>
            </div>
            <div className="stack-tight">
              <h3>{words.files.tableFile}</h3>
              <p className="second">{words.files.tableFileText}</p>
              <div>
                <HandOut make={() => exportTable(deps, study.id)}>{words.files.tableFileMake}</HandOut>
              </div>
            </div>
          </div>
        )}
      </Sheet>
      <Sheet title={words.files.in}>
        <div className="stack-tight">
          <p className="second">{words.files.inText}</p>
          <BringIn study={study?.id ?? null} />
        </div>
      </Sheet>
      <Sheet title={words.files.visitIn}>
        <TakeVisit />
      </Sheet>
      <Sheet title={words.files.kept}>
        <KeptWhere />
      </Sheet>
    </div>
  );
}

function KeptWhere() {
  const { words, device } = useServices();
  const [room, setRoom] = useState<Awaited<ReturnType<Device['room']>> | null>(null);
  useEffect(() => {
    let here = true;
    device.room().then((found) => {
      if (here) setRoom(found);
    });
    return () => {
      here = false;
    };
  }, [device]);
  return (
    <ul className="kept-lines">
      <li>{words.files.keptHere}</li>
      <li>{words.files.keptNames}</li>
      <li>{words.files.keptClear}</li>
      {room?.kept != null && <li>{room.kept ? words.files.roomKept : words.files.roomNotKept}</li>}
      {room?.free != null && <li>{words.files.roomFree({ free: room.free })}</li>}
    </ul>
  );
}
