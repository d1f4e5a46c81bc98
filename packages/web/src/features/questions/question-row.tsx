import { isMember, type QuestionRow as Row } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CallOut } from '../../components/call-out';
import { PlanLocator } from '../../components/plan-locator';
import { StateWord } from '../../components/state-word';
import { Verdict } from '../../components/verdict';
import { useActor } from '../../lib/session';
import { useTimes } from '../../lib/times';
import { waitWords } from './wait-words';
import classes from './questions.module.css';

/** Its place on the kit, its measured trouble, its state, and what it waits for since when. */
export function QuestionRow({ row }: { readonly row: Row }): ReactNode {
  const times = useTimes();
  return (
    <li className={classes['row']} data-unread={row.unread || undefined}>
      <span className={classes['locator']}>
        <PlanLocator regions={row.section?.regions ?? []} />
      </span>
      <div className={classes['what']}>
        <h3>
          <Link to={`/questions/${row.id}`}>{row.title}</Link>
          {row.unread && <span className={classes['unread']}>something new</span>}
        </h3>
        <p>
          <Place row={row} />
        </p>
      </div>
      <div className={classes['trouble']}>
        {row.headline && <Verdict verdict={row.headline.verdict}>{row.headline.text}</Verdict>}
      </div>
      <div className={classes['standing']}>
        <StateWord state={row.state} size="small" />
        <small>{waitWords(row, times)}</small>
      </div>
    </li>
  );
}

function Place({ row }: { readonly row: Row }): ReactNode {
  const me = useActor();
  const { section, partNumber, holeLineCode } = row;
  return (
    <>
      <CallOut>{row.number}</CallOut>
      {section ? ` · ${section.name}` : ' · the whole kit'}
      {section?.critical && ', critical'}
      {[partNumber, holeLineCode].filter(Boolean).map((code) => (
        <span key={code}>
          {' · '}
          <CallOut>{code}</CallOut>
        </span>
      ))}
      {` · ${row.askedBy.name}`}
      {!isMember(me, row.chapterId) && ` · ${row.chapterName}`}
    </>
  );
}
