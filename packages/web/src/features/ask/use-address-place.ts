import { useEffect } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { Draft } from '../../lib/drafts';
import { blankDraft, isEmptyDraft, type AskDraft } from './ask-draft';
import { isSamePlace, placeOfAddress } from './usual';

/**
 * Takes the place of the address into the draft, once: then it leaves the address, so that a page loaded again shows the
 * draft as it was left. Where another draft is half written, it is the asker who decides.
 */
export function useAddressPlace<C, P>({ value, loaded, set }: Draft<AskDraft<C, P>>) {
  const [query, setQuery] = useSearchParams();
  const place = placeOfAddress(query);
  const mayTake = value.handedOver === null && isEmptyDraft(value);
  const isTaken = place !== null && isSamePlace(place, value.place);
  const address = query.toString();

  useEffect(() => {
    if (!loaded || !place || !(mayTake || isTaken)) return;
    if (!isTaken) set((old) => ({ ...old, place }));
    setQuery({}, { replace: true, preventScrollReset: true });
    // Once for each address, whatever is typed afterwards.
  }, [loaded, address]);

  return {
    isInTheWay: loaded && place !== null && !mayTake && !isTaken,
    goOn: () => setQuery({}, { replace: true }),
    beginAnew: () => {
      set({ ...blankDraft<C, P>(), place: place! });
      setQuery({}, { replace: true });
    },
  };
}
