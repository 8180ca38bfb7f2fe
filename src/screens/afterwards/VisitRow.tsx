import { Button } from '../../ui/Button.tsx';
import { Hold, Ring, Tick } from '../../ui/Sign.tsx';
import { useWords } from '../services.ts';
import type { ListedSession, VisitGroup } from './visitGroups.ts';

interface Props {
  readonly visit: VisitGroup;
  /** Sessions that stay closed for now. */
  readonly held: ReadonlySet<string>;
  readonly byHand: (session: string) => boolean;
  readonly onPair: (session: string, observer: string) => void;
}

/** One visit: its class and phases, and each observer's record with how complete it is. */
export function VisitRow({ visit, held, byHand, onPair }: Props) {
  const words = useWords();
  const first = visit.sessions[0]?.summary.id ?? '';
  const starts = visit.sessions.flatMap(
    // A sheet was typed in at some other time.
    ({ summary: { plannedStart, firstWall, fromPaper } }) =>
      plannedStart ?? (fromPaper === true ? null : firstWall) ?? [],
  );
  const time = starts[0] === undefined ? '' : words.f.time(starts[0]);
  const protocols = new Set(visit.sessions.flatMap(({ summary }) => summary.protocol?.name ?? []));
  const facts = [time, words.f.list(visit.phases), words.f.list([...protocols])].filter(
    (text) => text !== '',
  );
  return (
    <li className="visit">
      <div className="visit-class">
        <strong>{visit.klass}</strong>
        <span className="second small">{facts.join(' · ')}</span>
      </div>
      <ul className="visit-records">
        {visit.sessions.map((session) => (
          <Record
            key={session.summary.id}
            session={session}
            held={held.has(session.summary.id)}
            byHand={byHand(session.summary.id)}
            onPair={() => onPair(session.summary.id, session.summary.observer.name)}
          />
        ))}
      </ul>
      <div className="visit-way">
        {visit.sessions.length > 1 && !visit.sessions.some(({ summary }) => held.has(summary.id)) && (
          <a className="button" href={`#/afterwards/visit/${encodeURIComponent(first)}`}>
            {words.afterwards.openAgreement({ records: visit.sessions.length })}
          </a>
        )}
      </div>
    </li>
  );
}

function Record({
  session: { summary, counts },
  held,
  byHand,
  onPair,
}: {
  readonly session: ListedSession;
  readonly held: boolean;
  readonly byHand: boolean;
  readonly onPair: () => void;
}) {
  const words = useWords();
  const { ended, role, practice, here, handedOver, own, fromPaper, familiarisation } = summary;
  const state =
    ended === 'complete' ? words.afterwards.complete : ended === 'early' ? words.afterwards.endedEarly : null;
  // A table never says that it ended; only a record made by a tablet can have been cut off.
  const table = summary.protocol === null;
  const remarks = [
    role === null ? '' : words.afterwards.role({ role }),
    practice ? words.afterwards.practice : '',
    familiarisation ? words.afterwards.familiarisation : '',
    fromPaper ? words.paper.fromPaper : '',
    table ? words.afterwards.fromFile : (state ?? words.afterwards.neverEnded),
    here && own > 0 && !handedOver ? words.afterwards.notHandedOver : '',
    byHand ? words.afterwards.moved : '',
    held ? words.afterwards.heldBack : '',
  ].filter((text) => text !== '');
  return (
    <li className="record">
      {table ? <Ring size={20} /> : ended === 'complete' ? <Tick size={20} /> : <Hold size={20} />}
      <a className="record-name" href={`#/afterwards/session/${encodeURIComponent(summary.id)}`}>
        {summary.observer.name}
      </a>
      <span className="second small grow">
        {remarks.join(', ')}
        {counts !== null && `, ${words.afterwards.scoredMissing(counts)}`}
      </span>
      <Button look="quiet" className="second small" onClick={onPair}>
        {words.afterwards.pairing}
      </Button>
    </li>
  );
}
