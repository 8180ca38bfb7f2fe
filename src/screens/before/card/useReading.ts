import { useRef, useState } from 'react';
import type { Problem } from '../../../kernel/result.ts';
import type { VisitPlan } from '../../../model/visitPlan.ts';
import { addParts, type CardParts, cardProblem, readPairingCard, readQr } from '../../../tasks/readCard.ts';
import { say } from '../../../words/say.ts';
import { type Pixels, useServices } from '../../services.ts';

/** Sides to which a picture is brought: a large photo is easier to read when it is made smaller, and the reverse. */
const edges = [1600, 1000, 2600];

/** What was read of a card so far, and every way to read more of it. */
export function useReading() {
  const { words, device } = useServices();
  // Beside the state, since frames of a camera come faster than React draws.
  const have = useRef<CardParts | null>(null);
  const [parts, setParts] = useState<CardParts | null>(null);
  const [visit, setVisit] = useState<VisitPlan | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);

  const hold = (found: Problem): void => setProblem(say(words.problems, found));
  const keep = (next: CardParts | null): void => {
    have.current = next;
    setParts(next);
  };

  /** Adds a text; true when it brought the whole visit. */
  const takeText = async (text: string): Promise<boolean> => {
    const added = addParts(have.current, text);
    if (!added.ok) {
      hold(added.problem);
      return false;
    }
    setProblem(null);
    const next = added.value;
    keep(next);
    if (next.parts.size < next.of) return false;
    const read = await readPairingCard(next);
    // Begun again meanwhile.
    if (have.current !== next) return false;
    if (read.ok) {
      setVisit(read.value);
      return true;
    }
    // Complete and yet not right: what was read is of no use any more.
    keep(null);
    hold(read.problem);
    return false;
  };

  const takeFrame = async (pixels: Pixels): Promise<boolean> => {
    const text = readQr(pixels);
    return text !== null && (await takeText(text));
  };

  const takePicture = async (picture: File): Promise<Problem | null> => {
    for (const edge of edges) {
      const pixels = await device.pixelsOf(picture, edge);
      if (pixels === null) return cardProblem('card.noPicture', { name: picture.name }).problem;
      const text = readQr(pixels);
      if (text === null) continue;
      const added = addParts(have.current, text);
      if (!added.ok) return added.problem;
      await takeText(text);
      return null;
    }
    return cardProblem('card.noCode', { name: picture.name }).problem;
  };

  /** Reads them all; the first thing that was wrong is said, and the others are read all the same. */
  const takePictures = async (pictures: readonly File[]): Promise<void> => {
    setBusy(true);
    setProblem(null);
    let wrong: Problem | null = null;
    for (const picture of pictures) {
      const found = await takePicture(picture);
      wrong ??= found;
    }
    if (wrong !== null) hold(wrong);
    setBusy(false);
  };

  const beginAgain = (): void => {
    keep(null);
    setVisit(null);
    setProblem(null);
  };

  return { parts, visit, problem, busy, takeText, takeFrame, takePictures, beginAgain };
}

export type Reading = ReturnType<typeof useReading>;
