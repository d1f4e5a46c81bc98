import type { Me } from '@rivetside/shared';
import { queryOptions, useQuery } from '@tanstack/react-query';
import { api } from '../../lib/api';
import { useMe } from '../../lib/session';
import type { IconName } from './icons';

export interface Place {
  readonly label: string;
  readonly to: string;
  readonly icon: IconName;
  /** Addresses below which one is at this place. */
  readonly below: readonly string[];
}

const BENCH: Place = { label: 'Bench', to: '/bench', icon: 'bench', below: ['/bench'] };
const KIT: Place = { label: 'Kit', to: '/kit', icon: 'kit', below: ['/kit', '/sections'] };
const QUESTIONS: Place = {
  label: 'Questions',
  to: '/questions',
  icon: 'questions',
  below: ['/questions', '/ask', '/desk'],
};
const RECORD: Place = { label: 'Record', to: '/record', icon: 'record', below: ['/record'] };

export const ownBuilds = (me: Me | null) =>
  queryOptions({
    queryKey: ['builds', 'own'] as const,
    queryFn: async ({ signal }) => {
      const { buildSchema, pageOf } = await import('../../lib/answers');
      return api.get('/builds', { answer: pageOf(buildSchema), signal });
    },
    enabled: me !== null,
    staleTime: 5 * 60_000,
  });

/** Where whoever is signed in can go; a record there is only with a build. */
export function usePlaces(): readonly Place[] {
  const { data } = useQuery(ownBuilds(useMe()));
  return (data?.items.length ?? 0) > 0 ? [BENCH, KIT, QUESTIONS, RECORD] : [BENCH, KIT, QUESTIONS];
}

export function isAt(place: Place, pathname: string): boolean {
  return place.below.some((one) => pathname === one || pathname.startsWith(`${one}/`));
}
