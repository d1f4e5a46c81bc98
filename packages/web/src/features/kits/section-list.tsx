import type { SectionSummary } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { PageCard } from '../../components/page-card';
import { RivetLine } from '../../components/rivet-line';
import { progressWords, sectionLine } from './plan-fills';
import classes from './kits.module.css';

interface SectionListProps {
  readonly sections: readonly SectionSummary[];
  readonly chosenId: string | null;
  readonly addressOf: (sectionId: string) => string;
  /** Kept with the address. */
  readonly state: unknown;
}

/** Every section with how far the reader's own build has come there. */
export function SectionList({ sections, chosenId, addressOf, state }: SectionListProps): ReactNode {
  return (
    <PageCard title="Sections" aside={sections.length}>
      <ul className={classes['sections']}>
        {sections.map((section) => (
          <li key={section.id}>
            <Link
              to={addressOf(section.id)}
              state={state}
              preventScrollReset
              aria-current={section.id === chosenId || undefined}
              className={classes['section']}
            >
              <span className={classes['name']}>
                <b>{section.name}</b>
                <span>{sectionLine(section)}</span>
              </span>
              {section.progress.length > 0 && (
                <RivetLine states={section.progress} label={progressWords(section.progress)} />
              )}
            </Link>
          </li>
        ))}
      </ul>
    </PageCard>
  );
}
