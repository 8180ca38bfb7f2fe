import type { SpeechPort } from '../recorder/ports.ts';

/** Faster than talk and slower than haste: a pseudonym is over well before its look. */
const rate = 1.1;

/**
 * The browser's own voices, of which only those on the tablet itself count: others would need a network, and would
 * hand pseudonyms over to it.
 */
export function speech(language: string): SpeechPort {
  const synthesis = typeof speechSynthesis === 'undefined' ? null : speechSynthesis;
  // Browsers load their voices when they are asked for the first time.
  synthesis?.getVoices();
  const voice = (): SpeechSynthesisVoice | null => {
    const here = synthesis?.getVoices().filter((one) => one.localService) ?? [];
    return here.find((one) => one.lang.startsWith(language)) ?? null;
  };
  return {
    available: () => voice() !== null,
    speak: (words, volume) => {
      const chosen = voice();
      if (synthesis === null || chosen === null) return;
      synthesis.cancel();
      const utterance = new SpeechSynthesisUtterance(words);
      utterance.voice = chosen;
      utterance.lang = chosen.lang;
      utterance.volume = volume;
      utterance.rate = rate;
      synthesis.speak(utterance);
    },
    hush: () => synthesis?.cancel(),
  };
}
