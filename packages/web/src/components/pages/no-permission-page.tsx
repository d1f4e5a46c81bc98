import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { MessagePage } from './message-page';

/** The children say for whom it is. */
export function NoPermissionPage({ children }: { readonly children?: ReactNode }): ReactNode {
  return (
    <MessagePage title="This page is not open to you.">
      {children ?? <p>Your chapter admin can tell you who may see it, and can change that.</p>}
      <Link to="/bench" className="btn plain">
        To the bench
      </Link>
    </MessagePage>
  );
}
