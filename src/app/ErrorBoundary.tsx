import { Component, type ReactNode } from 'react';
import { Button } from '../ui/Button.tsx';
import { PageHead } from '../ui/PageHead.tsx';
import type { CoreWords } from '../words/coreWords.ts';

interface Props {
  readonly words: CoreWords;
  readonly children: ReactNode;
}

/** A bug breaks one screen, never the recording: the recorder's state does not live in React. */
export class ErrorBoundary extends Component<Props, { broken: boolean }> {
  override state = { broken: false };

  static getDerivedStateFromError(): { broken: boolean } {
    return { broken: true };
  }

  override render(): ReactNode {
    if (!this.state.broken) return this.props.children;
    const { common } = this.props.words;
    return (
      <main className="page">
        <PageHead note={common.brokenText}>{common.brokenTitle}</PageHead>
        <Button look="main" onClick={() => this.setState({ broken: false })}>
          {common.brokenAgain}
        </Button>
      </main>
    );
  }
}
