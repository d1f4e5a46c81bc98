import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { MessagePage } from './message-page';

export function NotFoundPage({ what = 'page' }: { readonly what?: string }): ReactNode {
  return (
    <MessagePage title={`There is no such ${what}, or it is not yours to see.`}>
      <p>The link may be old. Nothing of yours was changed.</p>
      <Link to="/" className="btn plain">
        To the start
      </Link>
    </MessagePage>
  );
}
