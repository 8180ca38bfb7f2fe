import './spine.css';

export interface SpineTab {
  readonly href: string;
  readonly label: string;
  readonly here: boolean;
}

/** The index tabs of the exercise book: at its left edge, at the bottom in portrait and on phones. */
export function Spine({ tabs, label }: { readonly tabs: readonly SpineTab[]; readonly label: string }) {
  return (
    <nav className="spine not-in-print" aria-label={label}>
      <span className="spine-name" aria-hidden="true">
        {label}
      </span>
      {tabs.map((tab) => (
        <a key={tab.href} className="spine-tab" href={tab.href} aria-current={tab.here ? 'page' : undefined}>
          <span>{tab.label}</span>
        </a>
      ))}
    </nav>
  );
}
