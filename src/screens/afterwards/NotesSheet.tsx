import { useState } from 'react';
import type { KnownEntry } from '../../journal/entry.ts';
import { recordingFacts } from '../../journal/headerFacts.ts';
import { isKnown } from '../../journal/known.ts';
import type { StoredSession } from '../../journal/stored.ts';
import { addNote, type NoteWish } from '../../tasks/index.ts';
import { Button } from '../../ui/Button.tsx';
import { TextField } from '../../ui/Field.tsx';
import { Notice } from '../../ui/Notice.tsx';
import { Sheet } from '../../ui/Sheet.tsx';
import { say } from '../../words/say.ts';
import { useServices } from '../services.ts';

type Of<Kind extends KnownEntry['kind']> = Extract<KnownEntry, { kind: Kind }>;
const refOf = ({ writer, seq }: { writer: string; seq: number }): string => `${writer} ${seq}`;

/** Flags with their words, notes, and corrections with their reasons; words can be added later. */
export function NotesSheet({ session: { header, journal } }: { readonly session: StoredSession }) {
  const { words, deps } = useServices();
  const entries = journal.filter(isKnown);
  const withdrawn = new Set(
    entries.flatMap((entry) => (entry.kind === 'withdrawn' ? [refOf(entry.target)] : [])),
  );
  const kept = entries.filter((entry) => !withdrawn.has(refOf(entry)));
  const flags = kept.filter((entry): entry is Of<'flagged'> => entry.kind === 'flagged');
  const notes = kept.filter((entry): entry is Of<'noted'> => entry.kind === 'noted');
  const corrections = kept.filter((entry): entry is Of<'amended'> => entry.kind === 'amended');
  const flagRefs = new Set(flags.map(refOf));
  const alone = notes.filter(({ about }) => about === undefined || !flagRefs.has(refOf(about)));
  const { codeSet } = recordingFacts(header);
  const labelOf = (id: string): string => codeSet.codes.find((code) => code.id === id)?.label ?? id;
  const add = (wish: NoteWish) => addNote(deps, header.id, wish);
  return (
    <Sheet title={words.afterwards.notesTitle} className="not-in-print">
      <div className="stack-tight">
        {flags.length + alone.length === 0 && <p className="second">{words.afterwards.notesNone}</p>}
        {flags.length + alone.length > 0 && (
          <ul className="notes">
            {flags.map((flag) => {
              const own = notes.filter(({ about }) => about !== undefined && refOf(about) === refOf(flag));
              return (
                <li key={refOf(flag)} className="stack-tight">
                  <strong>{words.afterwards.flagAt({ at: flag.at, interval: flag.interval })}</strong>
                  {own.length === 0 && <p className="second">{words.afterwards.flagWithoutWords}</p>}
                  {own.map((note) => (
                    <p key={refOf(note)}>{note.text}</p>
                  ))}
                  <WordsField
                    label={words.afterwards.addWords}
                    onKeep={(text) => add({ text, about: { writer: flag.writer, seq: flag.seq } })}
                  />
                </li>
              );
            })}
            {alone.map((note) => (
              <li key={refOf(note)}>
                <span className="second small">{words.afterwards.noteAt({ at: note.at })}</span>
                <p>{note.text}</p>
              </li>
            ))}
          </ul>
        )}
        {corrections.length > 0 && (
          <>
            <h3>{words.afterwards.correctedTitle}</h3>
            <ul className="notes">
              {corrections.map((one) => (
                <li key={refOf(one)}>
                  {words.afterwards.corrected({
                    interval: one.interval,
                    to:
                      one.missing !== null
                        ? words.missing[one.missing]
                        : one.counts !== undefined
                          ? words.afterwards.toCounts(one.counts)
                          : one.codes === null || one.codes.length === 0
                            ? words.afterwards.keyNone
                            : words.f.list(one.codes.map(labelOf)),
                    by: one.by,
                    why: one.why,
                    wall: one.wall,
                  })}
                </li>
              ))}
            </ul>
          </>
        )}
        <WordsField
          label={words.afterwards.addNote}
          hint={words.afterwards.addNoteHint}
          onKeep={(text) => add({ text })}
        />
      </div>
    </Sheet>
  );
}

interface WordsFieldProps {
  readonly label: string;
  readonly hint?: string;
  readonly onKeep: (text: string) => ReturnType<typeof addNote>;
}

function WordsField({ label, hint, onKeep }: WordsFieldProps) {
  const { words } = useServices();
  const [text, setText] = useState('');
  const [problem, setProblem] = useState<string | null>(null);
  const keep = async () => {
    const kept = await onKeep(text);
    setProblem(kept.ok ? null : say(words.problems, kept.problem));
    if (kept.ok) setText('');
  };
  return (
    <form
      className="stack-tight not-in-print"
      onSubmit={(event) => {
        event.preventDefault();
        keep();
      }}
    >
      <TextField
        label={label}
        {...(hint !== undefined && { hint })}
        value={text}
        onChange={(event) => setText(event.target.value)}
      />
      {problem !== null && <Notice kind="hold">{problem}</Notice>}
      {text.trim() !== '' && (
        <div>
          <Button type="submit">{words.afterwards.keepWords}</Button>
        </div>
      )}
    </form>
  );
}
