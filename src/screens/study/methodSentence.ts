import type { Protocol } from '../../model/protocol.ts';
import { looksAtEverybody, watchesOne } from '../../schedule/orderOfDay.ts';
import type { Words } from '../../words/words.ts';

type Recipe = Pick<Protocol, 'method' | 'intervalMs' | 'observeMs' | 'lookAt' | 'rotation' | 'partLength'>;

/** A protocol in one line: "momentary, every 15 s, looked at the end of the interval, next child, 15 minutes a part". */
export function methodSentence({ study }: Words, recipe: Recipe): string {
  const { method, rotation, partLength } = recipe;
  const moments = method === 'momentary' || method === 'headcount';
  const parted = !moments && method !== 'duration' && recipe.observeMs < recipe.intervalMs;
  return study.protocolLine({
    method: study.method({ method }),
    seconds: method === 'duration' ? null : recipe.intervalMs / 1000,
    observeSeconds: parted ? recipe.observeMs / 1000 : null,
    lookAt: moments ? recipe.lookAt : null,
    turns: looksAtEverybody(recipe) ? 'everybody' : watchesOne(recipe) ? 'one' : rotation.kind,
    inRow: rotation.kind === 'block' ? rotation.intervals : 1,
    eachSeconds: rotation.kind === 'sweep' ? rotation.eachMs / 1000 : 0,
    peerEvery: rotation.kind === 'target' ? rotation.peerEvery : 0,
    minutes: partLength.kind === 'minutes' ? partLength.minutes : null,
    rounds: partLength.kind === 'rounds' ? partLength.rounds : null,
  });
}
