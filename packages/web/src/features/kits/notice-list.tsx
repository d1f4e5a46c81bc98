import { type Notice, NOTICE_CLASS_WORDS } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { CallOut } from '../../components/call-out';
import { useTimes } from '../../lib/times';
import classes from './kits.module.css';

interface NoticeListProps {
  readonly notices: readonly Notice[];
  /** Of the reader's own build, where they have one. */
  readonly serial?: number | undefined;
}

/** The kit maker's notices that touch a section, the newest first. */
export function NoticeList({ notices, serial }: NoticeListProps): ReactNode {
  const { date } = useTimes();
  if (notices.length === 0)
    return <p className={classes['quiet']}>No notice of the kit maker touches this section.</p>;
  return notices.map((notice) => (
    <div key={notice.id} className={classes['line']}>
      <h3>
        <span className={classes['class']} data-class={notice.class}>
          {NOTICE_CLASS_WORDS[notice.class]}
        </span>
        <CallOut>{notice.number}</CallOut> {notice.title}
      </h3>
      <p>{notice.text}</p>
      <p className="muted">
        {date(notice.issuedOn)}, revision {notice.revision}, serials {notice.serialFrom} to {notice.serialTo}
        {notice.holes ? `, holes ${notice.holes.replaceAll('-', ' to ')}` : ''}
      </p>
      {serial !== undefined && <p>{reachWords(notice, serial)}</p>}
    </div>
  ));
}

function reachWords({ serialFrom, serialTo }: Notice, serial: number): string {
  const isReached = serial >= serialFrom && serial <= serialTo;
  return isReached ? `Your serial ${serial} is among them.` : `Your serial ${serial} is not among them.`;
}
