import { audioSeconds } from '../../src/kernel/units.ts';
import { countInTick } from '../../src/recorder/cuePatterns.ts';
import type { AudioPort } from '../../src/recorder/ports.ts';

/**
 * What every audio port must do, written down as facts: the same list is asked of the real one in a browser and of the
 * one that tests drive by hand.
 *
 * @param wait lets that many milliseconds go by
 */
export async function factsOfAudioPort(
  audio: AudioPort,
  wait: (ms: number) => Promise<unknown>,
): Promise<Record<string, unknown>> {
  const facts: Record<string, unknown> = {};
  facts['before: silent, no clock, no facts'] = [audio.state(), audio.now(), audio.sample(), audio.facts()];
  audio.play(countInTick);
  audio.settle({ channel: 'left', volume: 0.3 });

  facts['unlock is ok'] = (await audio.unlock()).ok;
  const generation = audio.generation();
  facts['after: running'] = audio.state();
  facts['a sample rate is told'] = (audio.facts()?.sampleRate ?? 0) >= 8000;

  await wait(300);
  const first = audio.sample();
  await wait(600);
  const second = audio.sample();
  const page = (second?.page ?? 0) - (first?.page ?? 0);
  const sound = 1000 * ((second?.audio ?? 0) - (first?.audio ?? 0));
  facts['both clocks go on'] = page > 300 && sound > 300;
  facts['at one pace, up to the scatter of a reading'] = Math.abs(page - sound) <= 60;
  facts['what is laid may lie ahead of what is heard'] = (audio.now() ?? 0) >= (second?.audio ?? 0) - 0.02;

  const takeBack = audio.lay(countInTick, audioSeconds((audio.now() ?? 0) + 30));
  takeBack();
  takeBack();
  const during = audio.lay(countInTick, audioSeconds((audio.now() ?? 0) + 0.05));
  await wait(80);
  during();
  facts['the context is the same one'] = audio.generation() === generation;

  let told = 0;
  const stop = audio.subscribe(() => {
    told += 1;
  });
  stop();
  audio.close();
  audio.close();
  await wait(50);
  facts['closed: silent, nothing told after stopping'] = [audio.state(), audio.now(), told];
  facts['it opens again, with a new context'] =
    (await audio.unlock()).ok && audio.generation() > generation && audio.state() === 'running';
  audio.close();
  return facts;
}

export const whatAudioPortsDo: Record<string, unknown> = {
  'before: silent, no clock, no facts': ['silent', null, null, null],
  'unlock is ok': true,
  'after: running': 'running',
  'a sample rate is told': true,
  'both clocks go on': true,
  'at one pace, up to the scatter of a reading': true,
  'what is laid may lie ahead of what is heard': true,
  'the context is the same one': true,
  'closed: silent, nothing told after stopping': ['silent', null, 0],
  'it opens again, with a new context': true,
};
