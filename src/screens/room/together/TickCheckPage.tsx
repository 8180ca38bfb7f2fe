import { type KeyboardEvent, useEffect, useState, useSyncExternalStore } from 'react';
import { TickCheck } from '../../../recorder/tickCheck.ts';
import { Button } from '../../../ui/Button.tsx';
import { Notice } from '../../../ui/Notice.tsx';
import { useCoreServices } from '../../coreServices.ts';
import { useWallSecond } from './useWallSecond.ts';
import './together.css';

interface Props {
  readonly nudgeMs: number;
  readonly volume: number;
  readonly onKeep: (nudgeMs: number) => void;
  readonly onLeave: () => void;
}

const fineMs = 20;
const coarseMs = 1000;

const byKey: Record<string, number> = {
  ArrowRight: fineMs,
  ArrowLeft: -fineMs,
  ArrowUp: coarseMs,
  ArrowDown: -coarseMs,
};

/** Two tablets tick side by side, and one of them is nudged until the ticks are one. */
export function TickCheckPage({ nudgeMs, volume, onKeep, onLeave }: Props) {
  const { words, device } = useCoreServices();
  const { room } = words;
  const [check] = useState(() => new TickCheck(device.tickPorts(), nudgeMs));
  const [silent, setSilent] = useState(false);
  useEffect(() => () => check.stop(), [check]);
  const subscribe = (listener: () => void) => check.subscribe(listener);
  const ticking = useSyncExternalStore(subscribe, () => check.ticking);
  const by = useSyncExternalStore(subscribe, () => check.nudgeMs);
  const wall = useWallSecond(by);
  const toggle = async (): Promise<void> => {
    setSilent(false);
    if (ticking) check.stop();
    else setSilent(!(await check.start({ volume })).ok);
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    const step = byKey[event.key];
    if (step === undefined || event.ctrlKey || event.altKey || event.metaKey) return;
    event.preventDefault();
    check.nudge(step);
  };
  return (
    <main className="room-page" onKeyDown={onKeyDown}>
      <h1 tabIndex={-1}>{room.tickCheck}</h1>
      <p>{room.tickHow}</p>
      <p className="second">{room.tickTenth}</p>
      <div className="row">
        <Button look={ticking ? 'plain' : 'main'} onClick={toggle}>
          {ticking ? room.tickStop : room.tickStart}
        </Button>
        <p>
          <span className="visually-hidden">{room.tickClock} </span>
          <span className="together-clock">{wall.slice(11, 19)}</span>
        </p>
      </div>
      {silent && <Notice kind="hold">{room.tickSilent}</Notice>}
      <fieldset className="together-nudges">
        <legend>{room.tickNudges}</legend>
        <div className="together-steps">
          <Button onClick={() => check.nudge(-coarseMs)}>{room.tickLater}</Button>
          <Button onClick={() => check.nudge(-fineMs)}>{room.tickLaterFine}</Button>
          <Button onClick={() => check.nudge(fineMs)}>{room.tickEarlierFine}</Button>
          <Button onClick={() => check.nudge(coarseMs)}>{room.tickEarlier}</Button>
        </div>
        <p className="together-said" aria-live="polite">
          {room.tickNudge({ ms: by })}
        </p>
        <div className="row">
          <Button look="quiet" disabled={by === 0} onClick={() => check.reset()}>
            {room.tickZero}
          </Button>
          <p className="second small">{room.tickKeys}</p>
        </div>
      </fieldset>
      <div className="row">
        <Button look={ticking ? 'main' : 'plain'} onClick={() => onKeep(check.nudgeMs)}>
          {room.tickKeep}
        </Button>
        <Button look="quiet" onClick={onLeave}>
          {room.tickLeave}
        </Button>
      </div>
    </main>
  );
}
