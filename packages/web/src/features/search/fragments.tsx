import type { Fragment } from '@rivetside/shared';
import type { ReactNode } from 'react';

/** Text with the words that were found marked. */
export function Fragments({ of }: { readonly of: readonly Fragment[] }): ReactNode {
  return of.map(({ text, hit }, at) => (hit ? <mark key={at}>{text}</mark> : <span key={at}>{text}</span>));
}
