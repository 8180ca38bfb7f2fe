/** The shapes that carry meaning beside words and place. All of them read in grey. */

interface SignProps {
  readonly size?: number;
}

/** Ready: an ink tick. */
export function Tick({ size = 24 }: SignProps) {
  return (
    <svg width={size} height={size} viewBox="0 0 24 24" aria-hidden="true">
      <path
        d="M4 13 L9.5 18.5 L20 6.5"
        fill="none"
        stroke="var(--ink)"
        strokeWidth="3.6"
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </svg>
  );
}

/** A hold: an ochre stroke. */
export function Hold({ size = 24 }: SignProps) {
  return (
    <svg width={size} height={size} viewBox="0 0 24 24" aria-hidden="true">
      <path d="M12 3.5 V15" stroke="var(--ochre)" strokeWidth="4.6" strokeLinecap="round" />
      <circle cx="12" cy="20.6" r="2.4" fill="var(--ochre)" />
    </svg>
  );
}

/** Not known: a small ring. */
export function Ring({ size = 24 }: SignProps) {
  return (
    <svg width={size} height={size} viewBox="0 0 24 24" aria-hidden="true">
      <circle cx="12" cy="12" r="6.5" fill="none" stroke="var(--ink-2)" strokeWidth="2.4" />
    </svg>
  );
}

interface CodeSignProps extends SignProps {
  /** 0 = on-task (filled); 1, 2, 3 … kinds of off-task (hatched, denser each time); `other` = an outline with a dot. */
  readonly kind: number | 'other';
}

/** A code: on-task is a filled square, kinds of off-task are hatched ones, denser the further down the list. */
export function CodeSign({ kind, size = 34 }: CodeSignProps) {
  if (kind === 0) {
    return (
      <svg width={size} height={size} viewBox="0 0 34 34" aria-hidden="true">
        <rect x="0" y="0" width="34" height="34" rx="5" fill="var(--blue)" />
      </svg>
    );
  }
  if (kind === 'other') {
    return (
      <svg width={size} height={size} viewBox="0 0 34 34" aria-hidden="true">
        <rect x="1" y="1" width="32" height="32" rx="5" fill="none" stroke="var(--ink-2)" strokeWidth="2" />
        <circle cx="17" cy="17" r="4" fill="var(--ink-2)" />
      </svg>
    );
  }
  const gap = Math.max(3, 7.5 - (kind - 1) * 2.2);
  const lines: string[] = [];
  for (let d = gap / 2; d < 64; d += gap) {
    const [x1, y1] = d <= 32 ? [1, 1 + d] : [1 + (d - 32), 33];
    const [x2, y2] = d <= 32 ? [1 + d, 1] : [33, 1 + (d - 32)];
    lines.push(`M${x1} ${y1}L${x2} ${y2}`);
  }
  return (
    <svg width={size} height={size} viewBox="0 0 34 34" aria-hidden="true">
      <rect
        x="1"
        y="1"
        width="32"
        height="32"
        rx="5"
        fill="var(--sheet)"
        stroke="var(--ochre)"
        strokeWidth="2"
      />
      <path d={lines.join('')} stroke="var(--ochre)" strokeWidth="1.6" fill="none" />
    </svg>
  );
}
