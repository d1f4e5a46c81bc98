import { type ChapterMember, DISCIPLINE_WORDS, DISCIPLINES } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { useQuery } from '@tanstack/react-query';
import { ErrorPage } from '../../components/pages/error-page';
import { PageCard } from '../../components/page-card';
import { LinesSkeleton } from '../../components/skeletons';
import { chapterMembers } from './queries';
import classes from './bench.module.css';

interface ChapterCardProps {
  readonly chapterId: string;
  readonly chapterName: string;
}

/** Who mentors in what: where nobody does, a question waits for ever. */
export function MentorsCard({ chapterId, chapterName }: ChapterCardProps): ReactNode {
  const { data, error, refetch } = useQuery(chapterMembers(chapterId));
  return (
    <PageCard title={`Who mentors in ${chapterName}`} aside={data && memberWords(data.items)}>
      {error && !data ? (
        <ErrorPage error={error} onTryAgain={() => void refetch()} />
      ) : !data ? (
        <LinesSkeleton />
      ) : (
        <dl className={classes['mentors']}>
          {DISCIPLINES.map((discipline) => {
            const names = mentorsIn(data.items, discipline);
            return (
              <div key={discipline}>
                <dt>{DISCIPLINE_WORDS[discipline]}</dt>
                <dd>{names.length > 0 ? names.join(', ') : <b>nobody yet</b>}</dd>
              </div>
            );
          })}
        </dl>
      )}
    </PageCard>
  );
}

function mentorsIn(
  members: readonly ChapterMember[],
  discipline: ChapterMember['disciplines'][number],
): string[] {
  return members
    .filter(({ roles, disciplines }) => roles.includes('mentor') && disciplines.includes(discipline))
    .map(({ name, stampNumber }) =>
      stampNumber ? `${name}\u00a0(${stampNumber.replace('-', '\u2011')})` : name,
    );
}

function memberWords(members: readonly ChapterMember[]): string {
  const count = (role: ChapterMember['roles'][number]) =>
    members.filter(({ roles }) => roles.includes(role)).length;
  const [builders, mentors] = [count('builder'), count('mentor')];
  return `${builders} ${builders === 1 ? 'builder' : 'builders'}, ${mentors} ${mentors === 1 ? 'mentor' : 'mentors'}`;
}
