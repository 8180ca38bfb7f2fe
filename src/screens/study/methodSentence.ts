import type { Protocol } from '../../model/protocol.ts';
import type { Words } from '../../words/words.ts';

type Recipe = Pick<Protocol, 'method' | 'intervalMs' | 'observeMs' | 'rotation' | 'partLength'>;

/** A protocol in one line: "momentary, every 15 s, next child, 15 minutes a part". */
export function methodSentence({ study }: Words, recipe: Recipe): string {
  const { rotation, partLength } = recipe;
  const parted = recipe.method !== 'momentary' && recipe.observeMs < recipe.intervalMs;
  return study.protocolLine({
    method: study.method({ method: recipe.method }),
    seconds: recipe.intervalMs / 1000,
    observeSeconds: parted ? recipe.observeMs / 1000 : null,
    // A headcount looks at everybody.
    turns: recipe.method === 'headcount' ? null : recipe.method === 'duration' ? 'one' : rotation.kind,
    inRow: rotation.kind === 'block' ? rotation.intervals : 1,
    minutes: partLength.kind === 'minutes' ? partLength.minutes : null,
    rounds: partLength.kind === 'rounds' ? partLength.rounds : null,
  });
}
