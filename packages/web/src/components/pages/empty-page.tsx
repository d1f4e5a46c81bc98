import type { ReactNode } from 'react';
import { MessagePage } from './message-page';

/** Nothing there yet: the children say what to do first. */
export function EmptyPage({
  title,
  children,
}: {
  readonly title: string;
  readonly children?: ReactNode;
}): ReactNode {
  return <MessagePage title={title}>{children}</MessagePage>;
}
