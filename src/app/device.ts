import { audio } from '../devices/audio.ts';
import { battery } from '../devices/battery.ts';
import { disk } from '../devices/disk.ts';
import { tellsOutputChanges } from '../devices/outputChanges.ts';
import { pageClock } from '../devices/pageClock.ts';
import { recordingLock } from '../devices/recordingLock.ts';
import { share } from '../devices/share.ts';
import { speech } from '../devices/speech.ts';
import { timer } from '../devices/timer.ts';
import { vibration } from '../devices/vibration.ts';
import { visibility } from '../devices/visibility.ts';
import { wakeLock } from '../devices/wakeLock.ts';
import { wallClock } from '../devices/wallClock.ts';
import { toWallTime } from '../kernel/wallTime.ts';
import { cuePattern, headsUpPattern } from '../recorder/cuePatterns.ts';
import type { Device } from '../screens/services.ts';

/** What screens ask of the tablet, from the adapters. */
export function device(): Device {
  const testSound = audio();
  const voice = speech('en');
  return {
    playTestTone: async (cues) => {
      testSound.settle(cues);
      const unlocked = await testSound.unlock();
      if (!unlocked.ok) return { played: false, output: null, latencyMs: null };
      testSound.play(cuePattern('look'));
      return { played: true, output: unlocked.value.output, latencyMs: unlocked.value.latencyMs };
    },
    hasVoice: voice.available,
    tryHeadsUp: async (words, cues) => {
      if (voice.available()) {
        voice.speak(words, cues.volume);
        return 'voice';
      }
      testSound.settle(cues);
      const unlocked = await testSound.unlock();
      if (!unlocked.ok) return 'nothing';
      testSound.play(headsUpPattern);
      return 'tones';
    },
    tellsOutputChanges: tellsOutputChanges(),
    wakeLock: tryWakeLock,
    room: async () => ({ free: await disk.free(), kept: await disk.askToKeep() }),
    battery: () => battery.read(),
    otherTabRecords: () => recordingLock.heldElsewhere(),
    readyOffline,
    now: () => {
      const now = wallClock.now();
      return { wall: toWallTime(now, wallClock.offsetMinutes(now)), timeZone: wallClock.timeZone() };
    },
    vibrates: vibration.available,
    handOver: ({ name, type, bytes }) => share.handOver({ name, type, bytes: new Uint8Array(bytes) }),
    print: () => window.print(),
    // Loaded when it is wanted: the recording does without.
    openCamera: async (shown) => (await import('../devices/camera.ts')).openCamera(shown),
    pixelsOf: async (picture, edge) => (await import('../devices/pixelsOf.ts')).pixelsOf(picture, edge),
    copyText: async (text) => (await import('../devices/copyText.ts')).copyText(text),
    tickPorts: () => ({ audio: audio(), page: pageClock, wall: wallClock, timer, visibility }),
    wakeIn: timer.wakeIn,
  };
}

/** Asks for the lock for a moment: whether it is given is known only by asking. */
function tryWakeLock(): Promise<'held' | 'refused' | 'missing'> {
  const lock = wakeLock();
  return new Promise((resolve) => {
    const told = (): void => {
      const state = lock.state();
      if (state === 'idle') return;
      resolve(state);
      stop();
      lock.letGo();
    };
    const stop = lock.subscribe(told);
    lock.hold();
    told();
  });
}

/** True when the service worker has everything: it is active and no version is still being fetched for the first time. */
async function readyOffline(): Promise<boolean> {
  const registration = await navigator.serviceWorker?.getRegistration();
  return registration?.active !== null && registration?.active !== undefined;
}
