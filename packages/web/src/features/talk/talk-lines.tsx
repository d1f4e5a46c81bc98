import type { Photo, SheetEvent } from '@rivetside/shared';
import { Fragment, type ReactNode } from 'react';
import { MarginNote } from '../../components/margin-note';
import { PhotoStrip } from '../../components/photo-strip';
import { useTimes } from '../../lib/times';
import { eventWords } from './event-words';
import classes from './talk.module.css';

interface TalkLinesProps {
  readonly events: readonly SheetEvent[];
  /** Up to where the reader had come before. */
  readonly seenBefore: number;
  readonly readerId: string;
}

/** What was said and what happened, in order, with a mark before what is new to the reader. */
export function TalkLines({ events, seenBefore, readerId }: TalkLinesProps): ReactNode {
  const firstNew = events.find(({ seq, by }) => seq > seenBefore && by.id !== readerId)?.seq;
  return events.map((event) => (
    <Fragment key={event.seq}>
      {event.seq === firstNew && <p className={classes['new']}>new since you were here</p>}
      <Line event={event} />
    </Fragment>
  ));
}

function Line({ event }: { readonly event: SheetEvent }): ReactNode {
  const { dateTime } = useTimes();
  const { type, by, at, data } = event;
  if (type !== 'message')
    return (
      <p className={classes['happened']}>
        <b>{by.name}</b> {eventWords(event)} <span className="muted">{dateTime(at)}</span>
      </p>
    );
  const photos = (data['photos'] ?? []) as Photo[];
  return (
    <MarginNote name={by.name} when={dateTime(at)}>
      {String(data['body'])}
      {photos.length > 0 && <PhotoStrip photos={photos} label={`Photos of ${by.name}`} />}
    </MarginNote>
  );
}
