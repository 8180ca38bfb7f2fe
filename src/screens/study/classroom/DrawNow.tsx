import { useState } from 'react';
import type { Classroom } from '../../../model/classroom.ts';
import type { Protocol } from '../../../model/protocol.ts';
import { looksAtEverybody } from '../../../schedule/orderOfDay.ts';
import { drawTargets } from '../../../tasks/index.ts';
import { Button } from '../../../ui/Button.tsx';
import { Choice } from '../../../ui/Choice.tsx';
import { TextField } from '../../../ui/Field.tsx';
import { useServices } from '../../services.ts';
import { Stored } from '../Stored.tsx';
import { useDoing } from '../useDoing.tsx';

interface Props {
  readonly classroom: Classroom;
  /** Seed of a draw that was just taken back. */
  readonly lastSeed: string | null;
}

/** Not drawn yet: for which protocol, with which seed, and the draw itself. */
export function DrawNow(props: Props) {
  const { words, useStored } = useServices();
  const protocols = useStored((store) => store.protocols(props.classroom.study), [props.classroom.study]);
  return (
    <Stored answer={protocols}>
      {(found) => {
        const forDraws = found.filter((one) => !looksAtEverybody(one));
        if (found.length === 0) return <p className="second">{words.study.noProtocols}</p>;
        if (forDraws.length === 0) return <p className="second">{words.study.drawNotNeeded}</p>;
        return (
          <>
            {forDraws.length < found.length && <p className="second">{words.study.drawNotFor}</p>}
            <Draw {...props} protocols={forDraws} />
          </>
        );
      }}
    </Stored>
  );
}

function Draw({ classroom, lastSeed, protocols }: Props & { readonly protocols: readonly Protocol[] }) {
  const { words, deps } = useServices();
  const { run, notice, busy } = useDoing();
  const [chosen, choose] = useState(protocols[0]?.id ?? '');
  const [seed, setSeed] = useState('');
  const protocol = protocols.find((one) => one.id === chosen) ?? protocols[0];
  if (protocol === undefined) return null;
  const present = classroom.children.filter((child) => !child.removed).length;
  if (present === 0) return <p className="second">{words.study.drawNobody}</p>;
  const children = Math.min(present, protocol.childrenToDraw);
  const reserves = Math.min(present - children, protocol.reserves);
  return (
    <div className="stack-tight">
      <p className="second">{words.study.drawWhy}</p>
      {protocols.length > 1 && (
        <Choice
          legend={words.study.drawProtocol}
          value={protocol.id}
          onChange={choose}
          options={protocols.map((one) => ({
            value: one.id,
            label: one.name,
            hint: words.study.drawProtocolHint({ children: one.childrenToDraw, reserves: one.reserves }),
          }))}
        />
      )}
      <TextField
        label={words.study.seed}
        hint={
          lastSeed === null
            ? words.study.seedHint
            : `${words.study.seedHint} ${words.study.seedLast({ seed: lastSeed })}`
        }
        maxLength={200}
        value={seed}
        onChange={(event) => setSeed(event.target.value)}
      />
      {present < protocol.childrenToDraw + protocol.reserves && (
        <p>
          {words.study.drawFew({ children: present, wanted: protocol.childrenToDraw + protocol.reserves })}
        </p>
      )}
      {notice}
      <div className="row">
        <Button
          disabled={busy}
          onClick={() => run(drawTargets(deps, classroom.id, { id: protocol.id }, seed))}
        >
          {words.study.drawNow({ children, reserves })}
        </Button>
      </div>
    </div>
  );
}
