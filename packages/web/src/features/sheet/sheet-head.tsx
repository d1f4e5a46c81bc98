import { DISCIPLINE_WORDS, type Question, type SheetPresence } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { CallOut } from '../../components/call-out';
import { PlanLocator } from '../../components/plan-locator';
import { StateWord } from '../../components/state-word';
import { useTimes } from '../../lib/times';
import classes from './sheet.module.css';

interface SheetHeadProps {
  readonly sheet: Question;
  readonly people: SheetPresence['people'];
}

/** Where it is, whose it is, and how far it has come. */
export function SheetHead({ sheet, people }: SheetHeadProps): ReactNode {
  const { date } = useTimes();
  const { number, chapterName, askedBy, askedAt, serial, title, section, kitName, step } = sheet;
  const from = [
    number,
    chapterName,
    `${askedBy.name}, ${date(askedAt)}`,
    serial !== null && `build serial ${serial}`,
  ];
  const where = [kitName, section ? section.name : 'whole build', step && `step ${step.code}, ${step.title}`];
  return (
    <header className={classes['head']}>
      <PlanLocator regions={section?.regions ?? []} size={176} />
      <div className={classes['what']}>
        <p className="muted">{from.filter(Boolean).join(' · ')}</p>
        <h1>{title}</h1>
        <p className={classes['place']}>
          <span>{where.filter(Boolean).join(', ')}</span>
          <PlaceParts sheet={sheet} />
          <span>{DISCIPLINE_WORDS[sheet.discipline]}</span>
          {section?.critical && <b>critical section</b>}
        </p>
      </div>
      <div className={classes['standing']}>
        <StateWord state={sheet.state} />
        <p className="muted">{[goodUntil(sheet, date), atTheSheet(people)].filter(Boolean).join(' · ')}</p>
      </div>
    </header>
  );
}

function PlaceParts({ sheet: { part, holeLine, holes } }: { readonly sheet: Question }): ReactNode {
  const at = holes
    .map(({ repeat, hole }) => (repeat === 1 ? `${hole}` : `${hole} of repeat ${repeat}`))
    .join(', ');
  return (
    <>
      {part && (
        <span>
          part <CallOut>{part.number}</CallOut> {part.name}
        </span>
      )}
      {holeLine && (
        <span>
          hole line <CallOut>{holeLine.code}</CallOut> {at ? `hole ${at} of ${holeLine.count}, ` : ''}
          {holeLine.callOut}
        </span>
      )}
    </>
  );
}

/** The day until which the newest of the stamps that count stands. */
function goodUntil({ fixes }: Question, date: (iso: string) => string): string | null {
  const days = fixes
    .filter(({ withdrawn }) => !withdrawn)
    .flatMap(({ endorsements }) => endorsements.filter(({ state }) => state === 'live'))
    .map(({ goodUntil: day }) => day)
    .sort();
  return days.length > 0 ? `good until ${date(days.at(-1)!)}` : null;
}

function atTheSheet(people: SheetPresence['people']): string | null {
  if (people.length === 0) return null;
  return people.length === 1
    ? 'only you at the sheet'
    : `${people.length} at the sheet: ${people.map(({ name }) => name).join(', ')}`;
}
