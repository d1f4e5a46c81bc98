import { isBuilderIn, type Me, type Section } from '@rivetside/shared';
import { useDebouncedValue } from '@mantine/hooks';
import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { Problem } from '../../lib/problem';
import type { AskDraft } from './ask-draft';
import { buildsOfAsker, kitsToAsk, partsFound, sectionsToAsk, sectionToAsk } from './queries';
import { withUsual } from './usual';

const SEARCH_AFTER_MS = 250;

export function chaptersToAskIn(me: Me) {
  return me.memberships.filter(({ chapterId }) => isBuilderIn(me, chapterId));
}

function isGone(error: unknown): boolean {
  return error instanceof Problem && (error.status === 404 || error.status === 400);
}

/** What of the kit is read for a draft, and what of it could not be. */
function useKitOf(draft: AskDraft) {
  const kits = useQuery(kitsToAsk);
  const builds = useQuery(buildsOfAsker);
  const section = useQuery(sectionToAsk(draft.place.sectionId));
  const read = { kits: kits.data?.items, builds: builds.data?.items, section: section.data };
  return { read, queries: [kits, builds, section], isSectionGone: isGone(section.error) };
}

/** The chosen hole line as it is drawn. */
function useDrawn(section: Section | undefined, holeLineId: string | null) {
  return useMemo(() => {
    const line = section?.holeLines.find(({ id }) => id === holeLineId);
    return section && line ? { line, critical: section.critical } : null;
  }, [section, holeLineId]);
}

/** Everything around the place of a draft, and the draft with what is usual there. */
export function useWhere<D extends AskDraft>(draft: D, me: Me) {
  const { read, queries, isSectionGone } = useKitOf(draft);
  const { kits, builds, section } = read;
  const chapters = useMemo(() => chaptersToAskIn(me), [me]);
  const asked = useMemo(
    () => withUsual(draft, { kits, builds, chapters, section }),
    [draft, kits, builds, chapters, section],
  );
  const sections = useQuery(sectionsToAsk(asked.place.kitId));
  const failed = [...queries, sections].filter(({ isError }) => isError);
  const drawn = useDrawn(section, asked.place.holeLineId);
  return {
    /** The draft with what is usual. */
    asked,
    place: asked.place,
    chapters,
    kits: kits ?? [],
    builds: builds ?? [],
    sections: sections.data?.items,
    section,
    drawn,
    line: drawn && drawn.line,
    /** The address or the draft leads to a section that is not there. */
    isSectionGone,
    /** Why the kit could not be read; null where it could. */
    error: failed.length > 0 && !isSectionGone ? failed[0]!.error : null,
    tryAgain: () => void failed.forEach((query) => void query.refetch()),
  };
}

export type Where = Omit<ReturnType<typeof useWhere>, 'asked'>;

/** Parts by the words typed last, asked for when the typing rests. */
export function usePartSearch(kitId: string | null) {
  const [words, setWords] = useState('');
  const [settled] = useDebouncedValue(words, SEARCH_AFTER_MS);
  const { data } = useQuery(partsFound(kitId, words === '' ? '' : settled));
  return { found: data?.items, search: setWords };
}
