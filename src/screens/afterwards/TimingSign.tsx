import type { TimingVerdict } from '../../analysis/index.ts';

/** Four beats: even, one off, or one that is not there. */
const beats: Record<TimingVerdict['word'], readonly number[]> = {
  reliable: [4, 12, 20, 28],
  withCare: [4, 12, 23, 28],
  notReliable: [4, 12, 28],
};

/** How evenly the prompts came, as a shape that reads in grey. */
export function TimingSign({ word }: { readonly word: TimingVerdict['word'] }) {
  return (
    <svg width={32} height={24} viewBox="0 0 32 24" aria-hidden="true">
      <path d="M1 20.5 H31" stroke="var(--ink-2)" strokeWidth="1.6" />
      {beats[word].map((x) => (
        <path
          key={x}
          d={`M${x} 20.5 V${x === 23 ? 10 : 5}`}
          stroke="var(--ink)"
          strokeWidth="3.4"
          strokeLinecap="round"
        />
      ))}
      {word === 'notReliable' && (
        <circle cx="20" cy="12" r="4" fill="none" stroke="var(--ink-2)" strokeWidth="2" />
      )}
    </svg>
  );
}
