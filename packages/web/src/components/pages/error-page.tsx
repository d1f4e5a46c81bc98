import type { ReactNode } from 'react';
import { MessagePage } from './message-page';

interface ErrorPageProps {
  readonly error: unknown;
  readonly onTryAgain?: () => void;
}

function saidOf(error: unknown): { title: string; detail: string } {
  const { title, detail } = (error ?? {}) as { title?: string; detail?: string };
  return {
    title: title || 'This could not be read.',
    detail: detail || 'What you typed and sent before is kept.',
  };
}

/** What happened, what was kept, and a way on. */
export function ErrorPage({ error, onTryAgain }: ErrorPageProps): ReactNode {
  const { title, detail } = saidOf(error);
  return (
    <MessagePage title={title} alert>
      <p>{detail}</p>
      {onTryAgain && (
        <button type="button" className="btn" onClick={onTryAgain}>
          Try again
        </button>
      )}
    </MessagePage>
  );
}
