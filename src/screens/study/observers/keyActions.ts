import type { KeyAction } from '../../../model/observer.ts';
import type { Words } from '../../../words/words.ts';

/** Everything that a key can do, in the order of the list. */
export const keyActions: readonly KeyAction[] = [
  'code:1',
  'code:2',
  'code:3',
  'code:4',
  'code:5',
  'code:6',
  'cannot see',
  'nothing',
  'child before',
  'undo',
  'silence',
  'flag',
  'cover',
  'one more',
  'one fewer',
  'same again',
];

/** What a key does, in words: "code 1", "cannot see". */
export function actionLabel({ study }: Words, action: KeyAction): string {
  return action.startsWith('code:')
    ? study.keyCode({ n: Number(action.slice('code:'.length)) })
    : study.keyAction({ action });
}
