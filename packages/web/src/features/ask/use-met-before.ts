import type { HoleCard, SimilarQuery } from '@rivetside/shared';
import { useDebouncedValue } from '@mantine/hooks';
import { useQuery } from '@tanstack/react-query';
import type { AskDraft } from './ask-draft';
import { metBefore } from './queries';

const TYPING_ENDS_MS = 500;
const TEXT_LEAST = 4;
const TEXT_MOST = 500;

function queryOf({ place, title, body }: AskDraft, holeCard: HoleCard | null): SimilarQuery | null {
  const text = `${title.trim()} ${body.trim()}`.trim().slice(0, TEXT_MOST);
  const { sectionId, partId } = place;
  const words = text.length >= TEXT_LEAST ? text : null;
  if (!holeCard && !sectionId && !partId && !words) return null;
  return { holeCard, sectionId, partId, text: words };
}

/** Questions like the one being written, looked for whenever the hands rest. */
export function useMetBefore(draft: AskDraft, holeCard: HoleCard | null) {
  // As text: an object is another one at every keystroke, and the hands would never rest.
  const [settled] = useDebouncedValue(JSON.stringify(queryOf(draft, holeCard)), TYPING_ENDS_MS);
  const { data, isError } = useQuery(metBefore(JSON.parse(settled) as SimilarQuery | null));
  return { found: data?.items, isError };
}
