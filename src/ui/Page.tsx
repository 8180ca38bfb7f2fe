import type { ReactNode } from 'react';
import './page.css';

/** The right-hand page beside the spine. */
export function Page({ children }: { readonly children: ReactNode }) {
  return (
    <main className="page" id="page">
      {children}
    </main>
  );
}
