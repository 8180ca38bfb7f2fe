import { writeVisitFile } from '../../../src/exchange/writeVisitFile.ts';
import { idFromContent } from '../../../src/kernel/idFromContent.ts';
import type { WallTime } from '../../../src/kernel/units.ts';
import type { Protocol } from '../../../src/model/protocol.ts';
import type { VisitPlan } from '../../../src/model/visitPlan.ts';
import { protocolOf } from '../../support/session.ts';

interface Wish {
  readonly key: string;
  readonly protocol?: Partial<Protocol>;
  readonly phases?: readonly string[];
  readonly children?: number;
  readonly reserves?: number;
}

/** A visit that is over in a minute: three-second intervals, the shortest there are, seats in rows of five. */
export function shortVisit({
  key,
  protocol = {},
  phases = ['before'],
  children = 3,
  reserves = 0,
}: Wish): VisitPlan {
  const id = (...parts: string[]) => idFromContent('browser test', key, ...parts);
  const names = Array.from({ length: children }, (_, i) => `Otter-${String(i + 1).padStart(2, '0')}`);
  return {
    visit: id('visit'),
    study: {
      id: id('study'),
      name: 'Breaks',
      phases: ['before', 'after'],
      conditions: ['break', 'usual'],
      lessonParts: ['whole class', 'individual'],
    },
    classroom: { id: id('class'), name: 'Class Otter' },
    condition: 'break',
    plannedStart: null,
    children: names.map((pseudonym) => ({ id: id(pseudonym), pseudonym, stratum: null })),
    ...(reserves === 0
      ? {}
      : {
          reserves: Array.from({ length: reserves }, (_, i) => {
            const pseudonym = `Otter-${children + i + 1}`;
            return { id: id(pseudonym), pseudonym, stratum: null };
          }),
        }),
    plan: {
      columns: Math.min(Math.max(children, 2), 5),
      rows: Math.ceil(children / 5),
      observerSide: 'back',
      seats: names.map((pseudonym, i) => ({
        id: `seat-${i}`,
        column: i % 5,
        row: Math.floor(i / 5),
        table: i,
        child: id(pseudonym),
      })),
    },
    draw: null,
    orderSeed: null,
    schedule: {
      kind: 'laid',
      protocol: protocolOf({
        id: id('protocol'),
        study: id('study'),
        name: 'Every three seconds',
        intervalMs: 3000,
        observeMs: 3000,
        partLength: { kind: 'rounds', rounds: 2 },
        // A test's finger is quicker than the grace: its touch would belong to the look before.
        graceMs: 0,
        ...protocol,
      }),
      phases: [...phases],
    },
  };
}

/** The same as the file that a first tablet would hand over. */
export async function shortVisitFile(
  wish: Wish,
): Promise<{ name: string; mimeType: string; buffer: Buffer }> {
  const bytes = await writeVisitFile(shortVisit(wish), {
    exportedAt: '2026-11-03T09:00:00.000+00:00' as WallTime,
    app: 'test',
  });
  return { name: 'visit.lookbell-visit.json', mimeType: 'application/json', buffer: Buffer.from(bytes) };
}
