import type { Protocol } from '../model/protocol.ts';
import { confirmationClick, confirmationRhythm } from './cuePatterns.ts';
import type { VibrationPort } from './ports.ts';
import type { SoundDesk } from './soundDesk.ts';
import type { TouchWord } from './touchDesk.ts';

/** The answer to a touch that was taken, in ear and hand, different for each code. */
export class TouchAnswer {
  wanted = true;

  constructor(
    private readonly codes: Protocol['codeSet']['codes'],
    private readonly sound: SoundDesk,
    private readonly vibration: VibrationPort,
  ) {}

  give(word: TouchWord): void {
    if (!this.wanted) return;
    const place = word.kind === 'code' ? this.codes.findIndex(({ id }) => id === word.code) : -1;
    const touched = place < 0 ? 'other' : place;
    this.sound.play(confirmationClick(touched));
    if (this.vibration.available) this.vibration.vibrate(confirmationRhythm(touched));
  }
}
