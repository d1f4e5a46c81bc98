import { type ReactNode, useEffect, useRef } from 'react';

/** Kept with the address: it was gone to by a tap on this page, not by a link or the back key. */
export const BY_HAND = { chosenByHand: true } as const;
export const isByHand = (state: unknown): boolean =>
  (state as Partial<typeof BY_HAND> | null)?.chosenByHand === true;

interface ComesIntoSightProps {
  /** Once what it holds has been read: before that it is too short to be scrolled to. */
  readonly isWanted: boolean;
  readonly className: string | undefined;
  readonly children: ReactNode;
}

/** Where the page is one column what was chosen stands below everything else, and a tap would seem to do nothing. */
export function ComesIntoSight({ isWanted, className, children }: ComesIntoSightProps): ReactNode {
  const place = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (!isWanted || !window.matchMedia('(max-width: 1100px)').matches) return;
    place.current?.scrollIntoView({ block: 'start' });
  }, [isWanted]);
  return (
    <div ref={place} className={className}>
      {children}
    </div>
  );
}
