import type { Question } from '@rivetside/shared';
import { type ReactNode, useState } from 'react';
import { useTimes } from '../../lib/times';
import classes from './sheet.module.css';

interface SheetLayoutProps {
  readonly sheet: Question;
  readonly isCutOff: boolean;
  readonly left: ReactNode;
  readonly fixes: ReactNode;
  readonly talk: ReactNode;
  readonly met: ReactNode;
}

type Tab = 'sheet' | 'fixes' | 'talk';

/** Two columns at the bench, three parts one at a time on a phone. */
export function SheetLayout({ sheet, isCutOff, left, fixes, talk, met }: SheetLayoutProps): ReactNode {
  const { dateTime } = useTimes();
  const [tab, setTab] = useState<Tab>('sheet');
  const said = sheet.events.filter(({ type }) => type === 'message').length;
  const tabs: readonly (readonly [Tab, string])[] = [
    ['sheet', 'Sheet'],
    ['fixes', `Fixes ${sheet.fixes.length}`],
    ['talk', `Talk ${said}`],
  ];
  return (
    <>
      {isCutOff && (
        <p role="status" className={classes['banner']}>
          The connection is broken. What you write is kept, and the sheet catches up by itself.
        </p>
      )}
      {sheet.withdrawn && (
        <p className={classes['struck']}>
          Withdrawn by {sheet.askedBy.name}, {dateTime(sheet.withdrawn.at)}: {sheet.withdrawn.reason}
        </p>
      )}
      <div className={classes['tabs']} role="group" aria-label="Parts of the sheet">
        {tabs.map(([name, label]) => (
          <button key={name} type="button" aria-pressed={name === tab} onClick={() => setTab(name)}>
            {label}
          </button>
        ))}
      </div>
      <div className={classes['columns']} data-tab={tab}>
        <div className={classes['column']} data-part="sheet">
          {left}
        </div>
        <div className={classes['column']}>
          <div className={classes['column']} data-part="fixes">
            {fixes}
          </div>
          <div data-part="talk">{talk}</div>
          <div data-part="sheet">{met}</div>
        </div>
      </div>
    </>
  );
}
