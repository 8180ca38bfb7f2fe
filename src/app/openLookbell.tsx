import type { Root } from 'react-dom/client';
import { audio } from '../devices/audio.ts';
import { chance } from '../devices/chance.ts';
import { pageClock } from '../devices/pageClock.ts';
import { recordingLock } from '../devices/recordingLock.ts';
import { speech } from '../devices/speech.ts';
import { timer } from '../devices/timer.ts';
import { vibration } from '../devices/vibration.ts';
import { visibility } from '../devices/visibility.ts';
import { wakeLock } from '../devices/wakeLock.ts';
import { wallClock } from '../devices/wallClock.ts';
import type { Problem } from '../kernel/result.ts';
import type { CoreServices } from '../screens/coreServices.ts';
import { loadAhead } from '../screens/routes.tsx';
import { openStore } from '../storage/index.ts';
import { ensureInstallation } from '../tasks/installation.ts';
import type { Deps } from '../tasks/ports.ts';
import { PageHead } from '../ui/PageHead.tsx';
import { coreWordsFor } from '../words/coreWords.ts';
import { say } from '../words/say.ts';
import { App } from './App.tsx';
import { demoFiles } from './demoFiles.ts';
import { device } from './device.ts';
import { recorderDesk } from './recorderDesk.ts';
import { startWorker } from './startWorker.ts';
import { storeNotices } from './storeNotices.ts';
import { applyTheme } from './theme.ts';
import { watchForUpdates } from './updates.ts';
import { useStored } from './useStored.ts';

declare const __APP_VERSION__: string;

/** Opens the store, fills every port with its adapter, and shows the program; or says in one sentence why it cannot. */
export async function openLookbell(root: Root): Promise<void> {
  const words = coreWordsFor();
  const onTheme = applyTheme(document.documentElement, window.matchMedia('(prefers-color-scheme: dark)'));
  const updates = watchForUpdates();
  const notices = storeNotices();
  const ahead = loadAhead(window.location.hash);
  const opened = await openStore({ onNotice: notices.tell });
  const cannot = (why: Problem): void =>
    root.render(
      <main className="page">
        <PageHead>{say(words.problems, why)}</PageHead>
      </main>,
    );
  if (!opened.ok) return cannot(opened.problem);
  const store = opened.value;
  const tablet = device();
  const base: Omit<Deps, 'writer'> = {
    store,
    clock: { wall: () => tablet.now().wall },
    random: chance,
    app: __APP_VERSION__,
    device: navigator.userAgent,
    timeZone: wallClock.timeZone(),
  };
  const writer = await ensureInstallation(base);
  if (!writer.ok) return cannot(writer.problem);
  const deps: Deps = { ...base, writer: writer.value };

  const services: CoreServices = {
    words,
    store,
    deps,
    ask: startWorker(),
    device: tablet,
    recorder: recorderDesk(store, words, () => ({
      page: pageClock,
      wall: wallClock,
      timer,
      audio: audio(),
      visibility,
      wakeLock: wakeLock(),
      vibration,
      speech: speech('en'),
      lock: recordingLock,
      random: chance,
    })),
    useStored,
    demoFiles,
  };
  await ahead;
  root.render(<App services={services} updates={updates} notices={notices} onTheme={onTheme} />);
}
