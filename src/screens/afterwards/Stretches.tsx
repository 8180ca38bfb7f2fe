import { childrenOf, recordingFacts } from '../../journal/headerFacts.ts';
import { readOut } from '../../journal/readOut.ts';
import { fold } from '../../journal/step.ts';
import type { StoredSession } from '../../journal/stored.ts';
import { Sheet } from '../../ui/Sheet.tsx';
import { Table } from '../../ui/Table.tsx';
import { useWords } from '../services.ts';

/** A duration record stretch by stretch: from when to when, how long, and what. */
export function Stretches({ session: { header, journal } }: { readonly session: StoredSession }) {
  const words = useWords();
  const { afterwards, f } = words;
  const names = new Map(childrenOf(header).map(({ id, pseudonym }) => [id, pseudonym]));
  const labels = new Map(recordingFacts(header).codeSet.codes.map(({ id, label }) => [id, label]));
  const rows = readOut(fold(header, journal), { final: true });
  const clock = (ms: number): string => (Number.isNaN(ms) ? '' : f.clock(Math.floor(ms / 1000) * 1000));
  return (
    <Sheet title={afterwards.stretches}>
      <Table
        caption={afterwards.stretches}
        captionHidden
        rows={rows}
        rowKey={({ number }) => String(number)}
        columns={[
          { key: 'from', head: afterwards.stretchFrom, number: true, cell: ({ openAt }) => clock(openAt) },
          { key: 'to', head: afterwards.stretchTo, number: true, cell: ({ closeAt }) => clock(closeAt) },
          {
            key: 'lasted',
            head: afterwards.stretchLasted,
            number: true,
            cell: ({ openAt, closeAt }) => clock(closeAt - openAt),
          },
          {
            key: 'what',
            head: afterwards.stretchWhat,
            cell: ({ codes, missing, amended }) =>
              afterwards.cell({
                codes: codes === null ? null : codes.map((code) => labels.get(code) ?? code),
                missing: missing === null ? null : words.missing[missing],
                late: false,
                amended,
              }),
          },
          {
            key: 'who',
            head: afterwards.stretchWho,
            cell: ({ child }) => (child === null ? '' : (names.get(child) ?? child)),
          },
        ]}
      />
    </Sheet>
  );
}
