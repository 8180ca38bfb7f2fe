import type { ChangeDetails, ChangeSentence, ClassChangeDetails } from '../../analysis/index.ts';
import { say } from '../../words/say.ts';
import { useWords } from '../services.ts';

/** A heading and what to know before believing it. */
export interface Saying {
  readonly title: string;
  readonly note: string;
}

interface Limits {
  readonly lower: number | null;
  readonly upper: number | null;
}

/** The sentences of change; they say no more than the design allows. */
export function useChangeSentence(details: ChangeDetails): {
  readonly all: Saying;
  readonly of: (one: ClassChangeDetails) => Saying;
} {
  const words = useWords();
  const { before, after } = details;
  const nameOf = (name: string): string => (name === '' ? words.change.withoutName : name);
  const titleOf = (sentence: ChangeSentence): string => {
    const { code, values } = sentence;
    const klass = typeof values.class === 'string' ? { class: nameOf(values.class) } : {};
    return say(words.change, { code, values: { ...values, ...klass, before, after } });
  };
  const range = ({ lower, upper }: Limits): string => {
    if (lower === null || upper === null) return words.change.noteNoRange;
    // A t interval knows nothing of 0 and 100 %; from two or three children it may promise what cannot be.
    if (lower < -100 || upper > 100) return words.change.noteRangeTooWide;
    return words.change.noteRange({ lower, upper });
  };

  const of = ({ row, sentence }: ClassChangeDetails): Saying =>
    sentence.code === 'changeUndefined'
      ? { title: words.change.changeUndefined, note: words.change.undefinedText }
      : { title: titleOf(sentence), note: `${range(row)} ${words.change.noteOneClass}` };

  return { of, all: all() };

  function all(): Saying {
    const { sentence, report } = details;
    const [pooled] = report.pooled;
    const [first] = report.classes;
    switch (sentence.code) {
      case 'changeUndefined':
        return { title: words.change.changeUndefined, note: words.change.undefinedText };
      case 'describesOnly': {
        const known = report.classes.find((row) => row.change !== null) ?? first;
        return {
          title: titleOf(sentence),
          note: `${known === undefined ? '' : `${range(known)} `}${words.change.noteOneClass}`,
        };
      }
      case 'classesDescribe':
        // One condition: the classes together are one estimate. Several without a comparison: only counted.
        return report.pooled.length === 1 && pooled !== undefined && pooled.change !== null
          ? {
              title: words.change.classesTogether({
                points: pooled.change,
                of: details.stretchMinutes,
                before,
                after,
              }),
              note: `${range(pooled)} ${words.change.noteClasses}`,
            }
          : { title: titleOf(sentence), note: words.change.noteClasses };
      case 'classesCompared':
      case 'classAndBreakInseparable': {
        const limits = report.comparison ?? { lower: null, upper: null };
        const design =
          sentence.code === 'classesCompared' ? words.change.noteCompared : words.change.noteInseparable;
        return { title: titleOf(sentence), note: `${range(limits)} ${design}` };
      }
    }
  }
}
