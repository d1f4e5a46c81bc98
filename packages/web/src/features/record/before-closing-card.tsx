import type { Build, OpenItem, SectionSummary } from '@rivetside/shared';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { ErrorPage } from '../../components/pages/error-page';
import { PageCard } from '../../components/page-card';
import { LinesSkeleton } from '../../components/skeletons';
import { openCount } from './open-count';
import { OpenItems } from './open-items';
import { buildOpenItems } from './queries';
import classes from './record.module.css';

interface BeforeClosingCardProps {
  readonly build: Build;
  readonly section: Pick<SectionSummary, 'id' | 'name'>;
}

const isOpenIn =
  (sectionId: string) =>
  ({ clearedAt, sectionId: its }: OpenItem) =>
    clearedAt === null && its === sectionId;

/** What stands between the section in hand and its last rivets. */
export function BeforeClosingCard({ build, section }: BeforeClosingCardProps): ReactNode {
  const { data, error, refetch } = useQuery(buildOpenItems(build.id));
  const here = data?.items.filter(isOpenIn(section.id)) ?? [];
  return (
    <PageCard title="Before this section can be closed" aside={data && openCount(here.length)}>
      {error && !data ? (
        <ErrorPage error={error} onTryAgain={() => void refetch()} />
      ) : !data ? (
        <LinesSkeleton />
      ) : (
        <>
          {here.length === 0 && <p className={classes['quiet']}>Nothing is open in {section.name}.</p>}
          <OpenItems items={here} label={`Open in ${section.name}`} mayClear={build.mine} isOfOneSection />
        </>
      )}
    </PageCard>
  );
}
