import { useEffect } from 'react';

/** The tab's name; whoever has many tabs open looks for the first words. */
export function usePageTitle(text: string): void {
  useEffect(() => {
    document.title = text === '' ? 'Rivetside' : `${text} · Rivetside`;
  }, [text]);
}
