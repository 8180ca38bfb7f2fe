import type { ReactNode } from 'react';
import './figures.css';

/** A row of figures with their names: the companions of the sentence on top. */
export function Figures({
  items,
}: {
  readonly items: readonly { readonly name: ReactNode; readonly value: ReactNode }[];
}) {
  return (
    <dl className="figures">
      {items.map((item, i) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: fixed order, no identity
        <div key={i}>
          <dt>{item.name}</dt>
          <dd>{item.value}</dd>
        </div>
      ))}
    </dl>
  );
}
