import { render } from '@testing-library/react';
import { type ReactNode, useEffect, useState } from 'react';
import { Router } from 'wouter';
import { memoryLocation } from 'wouter/memory-location';
import { seededRandom } from '../../../src/kernel/random.ts';
import { problem, type Result } from '../../../src/kernel/result.ts';
import type { WallTime } from '../../../src/kernel/units.ts';
import { CoreServicesContext, useCoreServices } from '../../../src/screens/coreServices.ts';
import { type Device, type Services, ServicesContext } from '../../../src/screens/services.ts';
import { memoryStore } from '../../../src/storage/index.ts';
import type { StoreReader } from '../../../src/tasks/ports.ts';
import { wordsFor } from '../../../src/words/words.ts';
import { askDirectly } from '../../../src/worker/askDirectly.ts';

const wall = '2026-11-03T10:41:00.000+00:00' as WallTime;

/** A tablet on which everything is well; tests spoil what they are about. */
export function fakeDevice(changes: Partial<Device> = {}): Device {
  return {
    playTestTone: async () => ({ played: true, output: null, latencyMs: 20 }),
    hasVoice: () => false,
    tryHeadsUp: async () => 'tones',
    tellsOutputChanges: true,
    wakeLock: async () => 'held',
    room: async () => ({ free: 2_000_000_000, kept: true }),
    battery: async () => ({ level: 0.9, charging: false }),
    otherTabRecords: async () => false,
    readyOffline: async () => true,
    now: () => ({ wall, timeZone: 'Europe/London' }),
    vibrates: false,
    handOver: async () => 'saved',
    print: () => {},
    openCamera: async () => 'missing',
    pixelsOf: async () => null,
    copyText: async () => true,
    tickPorts: () => {
      throw new Error('no tick check in this test');
    },
    wakeIn: () => () => {},
    ...changes,
  };
}

function useStored<T>(
  query: (reader: StoreReader) => Promise<Result<T>>,
  dependencies: readonly unknown[],
): Result<T> | undefined {
  const { store } = useCoreServices();
  const [answer, setAnswer] = useState<Result<T>>();
  // biome-ignore lint/correctness/useExhaustiveDependencies: the caller names what the query depends on
  useEffect(() => store.watch(query, setAnswer), [store, ...dependencies]);
  return answer;
}

/** Services over a store in memory. */
export function fakeServices(changes: Partial<Services> = {}): Services {
  const store = changes.store ?? memoryStore();
  return {
    words: wordsFor(),
    store,
    deps: {
      store,
      clock: { wall: () => wall },
      random: seededRandom('screens'),
      writer: 'tablet-1',
      app: 'test',
      device: 'test',
      timeZone: 'Europe/London',
    },
    ask: askDirectly(store),
    device: fakeDevice(),
    recorder: {
      current: () => null,
      currentId: () => null,
      open: async () => problem('session.notThere'),
      resume: async () => problem('session.notThere'),
      close: () => {},
      subscribe: () => () => {},
    },
    useStored,
    demoFiles: async () => problem('demo.notThere'),
    ...changes,
  };
}

/** Renders a screen at an address; `visited` tells where it went from there. */
export function renderScreen(screen: ReactNode, services: Services, path = '/before') {
  const { hook, history } = memoryLocation({ path, record: true });
  const view = render(
    <CoreServicesContext value={services}>
      <ServicesContext value={services}>
        <Router hook={hook}>{screen}</Router>
      </ServicesContext>
    </CoreServicesContext>,
  );
  return { ...view, visited: history };
}
