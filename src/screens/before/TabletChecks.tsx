import { useServices } from '../services.ts';
import { CheckRow, type CheckState } from './CheckRow.tsx';
import { bytesPerLesson, leastCharge, leastRoom, type TabletFacts } from './checks.ts';

interface Line {
  readonly check: 'awake' | 'room' | 'battery' | 'offline' | 'clock' | 'onlyHere';
  readonly state: CheckState;
  readonly text: string;
}

/** What the tablet tells about itself, as lines with a state. */
export function useTabletLines(facts: TabletFacts | undefined): readonly Line[] {
  const { words, device } = useServices();
  if (facts === undefined) return [];
  const w = words.before;
  const { wall, timeZone } = device.now();
  const { free, kept } = facts.room;
  const lessons = free === null ? 0 : Math.floor(free / bytesPerLesson / 100) * 100;
  const roomState: CheckState = free === null ? 'unknown' : free < leastRoom ? 'hold' : 'ready';
  const roomText =
    free === null
      ? w.roomUnknown
      : free < leastRoom
        ? w.roomLow
        : kept === false
          ? w.roomNotKept({ lessons })
          : w.roomFree({ lessons });
  const { battery } = facts;
  const low = battery !== null && !battery.charging && battery.level < leastCharge;
  const batteryText =
    battery === null
      ? w.batteryUnknown
      : low
        ? w.batteryLow({ percent: battery.level * 100 })
        : w.batteryFull({ percent: battery.level * 100, charging: battery.charging });
  return [
    {
      check: 'awake',
      state: facts.awake === 'held' ? 'ready' : 'hold',
      text: { held: w.awakeHeld, refused: w.awakeRefused, missing: w.awakeMissing }[facts.awake],
    },
    { check: 'room', state: roomState, text: roomText },
    { check: 'battery', state: battery === null ? 'unknown' : low ? 'hold' : 'ready', text: batteryText },
    {
      check: 'offline',
      state: facts.offline ? 'ready' : 'hold',
      text: facts.offline ? w.offlineReady : w.offlineNot,
    },
    {
      check: 'clock',
      state: 'ready',
      text: w.clockText({ time: words.f.time(wall), zone: timeZone ?? wall.slice(23) }),
    },
    {
      check: 'onlyHere',
      state: facts.otherTab ? 'hold' : 'ready',
      text: facts.otherTab ? w.onlyHereNo : w.onlyHereYes,
    },
  ];
}

export function TabletChecks({ lines }: { readonly lines: readonly Line[] }) {
  const { words } = useServices();
  return lines.map((line) => (
    <CheckRow key={line.check} name={words.before[line.check]} state={line.state}>
      {line.text}
    </CheckRow>
  ));
}
