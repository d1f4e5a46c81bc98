import type { Units } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { PlanView } from '../../components/plan-view';
import { LinesSkeleton } from '../../components/skeletons';
import { sentenceOf } from '../../lib/problem';
import { atPart, inSection, type AskedPlace } from './ask-draft';
import classes from './ask.module.css';
import { PartFinder } from './part-finder';
import { planRegions, sectionAt } from './plan-regions';
import type { Faults } from './read-question';
import { usePartSearch, type Where } from './use-where';
import { WhereCard } from './where-card';

interface WherePartProps {
  readonly where: Where;
  readonly units: Units;
  readonly errors: Faults;
  readonly onPlace: (place: AskedPlace) => void;
  /** Below the place: for which aircraft, and who is asked. */
  readonly children: ReactNode;
}

/** Where on the kit, with the drawn plan, the search for a part, and what to do when the kit cannot be read. */
export function WherePart({ where, units, errors, onPlace, children }: WherePartProps): ReactNode {
  const { place, sections, section, kits } = where;
  const parts = usePartSearch(place.kitId);
  if (where.error)
    return (
      <div className={classes['unread']} role="alert">
        <p>The kit could not be read. {sentenceOf(where.error)} What you typed is kept.</p>
        <button type="button" className="btn plain" onClick={where.tryAgain}>
          Try again
        </button>
      </div>
    );
  if (!sections) return <LinesSkeleton />;
  function handleRegion(region: string) {
    const sectionId = sectionAt(sections!, region, place.sectionId);
    if (sectionId) onPlace(inSection(place, sectionId));
  }
  return (
    <>
      <WhereCard
        place={place}
        onChange={onPlace}
        kits={kits}
        sections={sections}
        section={section}
        units={units}
        errors={
          where.isSectionGone
            ? { ...errors, sectionId: 'That section is not there any more: choose another.' }
            : errors
        }
        plan={
          <PlanView
            name="Plan of the kit: choose a section"
            regions={planRegions(sections, place.sectionId)}
            onChoose={handleRegion}
          />
        }
        partFinder={
          <PartFinder
            found={parts.found}
            onSearch={parts.search}
            onPick={(part) => onPlace(atPart(place, part, section))}
          />
        }
      />
      {children}
    </>
  );
}
