/* global AudioWorkletProcessor, currentFrame, registerProcessor */
// Runs on the audio thread of a page under test and notes, by the sample, when something is heard.

/** Quieter than this is silence: far below any cue, far above rounding. */
const floor = 1e-5;

class Capture extends AudioWorkletProcessor {
  /** @param {{ processorOptions: { silence: number } }} options */
  constructor({ processorOptions }) {
    super();
    // Frames of silence that end a sound; a tone's own crossings through zero are shorter.
    this.silence = processorOptions.silence;
    this.sound = null;
    this.lastHeard = Number.NEGATIVE_INFINITY;
    this.port.postMessage({ kind: 'listening', frame: currentFrame });
  }

  /** @param {Float32Array[][]} inputs */
  process([channels = []]) {
    const [left, right = left] = channels;
    if (left) {
      for (let i = 0; i < left.length; i += 1)
        this.hear(currentFrame + i, Math.abs(left[i]), Math.abs(right[i]));
    }
    if (this.sound && currentFrame - this.lastHeard > this.silence) {
      this.port.postMessage({ kind: 'sound', ...this.sound, end: this.lastHeard + 1 });
      this.sound = null;
    }
    return true;
  }

  /** @param {number} frame @param {number} left @param {number} right */
  hear(frame, left, right) {
    if (left <= floor && right <= floor) return;
    if (this.sound && frame - this.lastHeard > this.silence) {
      this.port.postMessage({ kind: 'sound', ...this.sound, end: this.lastHeard + 1 });
      this.sound = null;
    }
    if (!this.sound) {
      this.sound = { onset: frame, left: 0, right: 0 };
      this.port.postMessage({ kind: 'begun', onset: frame });
    }
    this.sound.left = Math.max(this.sound.left, left);
    this.sound.right = Math.max(this.sound.right, right);
    this.lastHeard = frame;
  }
}

registerProcessor('capture', Capture);
