import { expect, it } from 'vitest';
import { FakeAudio } from '../recorder/fakes/fakeAudio.ts';
import { HandClock } from '../recorder/fakes/handClock.ts';
import { factsOfAudioPort, whatAudioPortsDo } from './audioPort.ts';

it('the audio that tests drive by hand does what the real one does', async () => {
  const clock = new HandClock();
  expect(await factsOfAudioPort(new FakeAudio(clock), (ms) => clock.advance(ms))).toEqual(whatAudioPortsDo);
});
