import { readOut } from '../../journal/readOut.ts';
import { fold } from '../../journal/step.ts';
import type { StoredSession } from '../../journal/stored.ts';
import { Sheet } from '../../ui/Sheet.tsx';
import { Table } from '../../ui/Table.tsx';
import { useWords } from '../services.ts';

/** A headcount scan by scan: how many were on-task of how many present, or why there was none. */
export function Scans({ session: { header, journal } }: { readonly session: StoredSession }) {
  const words = useWords();
  const { afterwards, f } = words;
  const rows = readOut(fold(header, journal), { final: true });
  return (
    <Sheet title={afterwards.scans}>
      <Table
        caption={afterwards.scans}
        captionHidden
        rows={rows}
        rowKey={({ number }) => String(number)}
        columns={[
          { key: 'scan', head: afterwards.scan, rowHead: true, cell: ({ number }) => f.whole(number) },
          { key: 'phase', head: afterwards.scanPhase, cell: ({ phase }) => phase ?? '' },
          {
            key: 'on',
            head: afterwards.scanOn,
            number: true,
            cell: ({ counts }) => (counts === null ? '' : f.whole(counts.on)),
          },
          {
            key: 'present',
            head: afterwards.scanPresent,
            number: true,
            cell: ({ counts }) => (counts === null ? '' : f.whole(counts.present)),
          },
          {
            key: 'why',
            head: afterwards.why,
            cell: ({ missing }) => (missing === null ? '' : words.missing[missing]),
          },
        ]}
      />
    </Sheet>
  );
}
