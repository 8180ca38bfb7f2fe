import type { RefObject } from 'react';
import { useCoreWords } from '../../coreServices.ts';
import { useFacts } from '../RoomFacts.tsx';
import { StartPage } from '../StartPage.tsx';
import { secondOfDay } from './agreedSecond.ts';
import { StartTogether } from './StartTogether.tsx';
import { TickCheckPage } from './TickCheckPage.tsx';
import { type StartsBy, useTogether } from './useTogether.ts';

/** Two observers before they begin: the tick check, then a shared count or an agreed second. */
export function BeforeTogether({ startsBy }: { readonly startsBy: RefObject<StartsBy | null> }) {
  const { room } = useCoreWords();
  const { header } = useFacts();
  const together = useTogether(header, startsBy);
  const { by, at, now, nudgeMs, keep, leave } = together;
  const { schedule } = header;
  if (together.checking && schedule.kind === 'laid')
    return (
      <TickCheckPage nudgeMs={nudgeMs} volume={schedule.protocol.cues.volume} onKeep={keep} onLeave={leave} />
    );
  const bySecond = by === 'second';
  return (
    <StartPage
      title={bySecond ? room.readyTitleSecond : room.readyTitleShared}
      text={bySecond ? room.readySecond : room.readyShared}
      start={bySecond ? room.startAt({ time: secondOfDay(at, now) }) : room.start}
      how={together.how}
    >
      <StartTogether together={together} />
    </StartPage>
  );
}
