import { useMemo } from 'react';
import { intervalsInPart, type LayOutRecipe } from '../../../schedule/layOut.ts';
import { looksAtEverybody, watchesOne } from '../../../schedule/orderOfDay.ts';
import { drawTurns } from '../../../schedule/turns.ts';
import type { ProtocolDraft } from '../../../tasks/index.ts';
import { Sheet } from '../../../ui/Sheet.tsx';
import { SchedulePicture } from '../../schedule/SchedulePicture.tsx';
import { useWords } from '../../services.ts';

const onePart = [''];

/** One part of the schedule as a picture, with children without names, while the recipe is being changed. */
export function SchedulePreview({ draft }: { readonly draft: ProtocolDraft }) {
  const { study } = useWords();
  const recipe = useRecipe(draft);
  const count = watchesOne(draft) ? 1 : draft.childrenToDraw;
  const children = useMemo(
    () =>
      Array.from({ length: count }, (_, k) => ({
        id: `${k + 1}`,
        label: study.placeholderChild({ n: k + 1 }),
      })),
    [count, study],
  );
  const intervals = intervalsInPart(draft.partLength, draft, count);
  const eachRound =
    draft.order === 'random each round' && !looksAtEverybody(draft) && !watchesOne(draft) && count > 1;
  const { rotation } = draft;
  const turns = useMemo(
    () => (eachRound ? drawTurns({ rotation }, count, intervals, 1, 'a picture') : undefined),
    [eachRound, rotation, count, intervals],
  );
  if (intervals === 0) return null;
  return (
    <Sheet title={looksAtEverybody(draft) ? study.pictureEverybody : study.pictureTitle}>
      <div className="stack-tight">
        {count > 1 && !looksAtEverybody(draft) && (
          <p className="second small">{eachRound ? study.pictureNoteEachRound : study.pictureNote}</p>
        )}
        <SchedulePicture protocol={recipe} phases={onePart} watched={children} turns={turns} />
      </div>
    </Sheet>
  );
}

/** What of a draft decides the picture: names and codes may be typed without drawing it anew. */
function useRecipe(draft: ProtocolDraft): LayOutRecipe {
  const { method, intervalMs, observeMs, lookAt, rotation, partLength } = draft;
  return useMemo(
    () => ({ method, intervalMs, observeMs, lookAt, rotation, partLength }),
    [method, intervalMs, observeMs, lookAt, rotation, partLength],
  );
}
