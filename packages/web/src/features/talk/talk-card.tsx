import { canTalk, type Me, type Question, type SheetEvent, type SheetPresence } from '@rivetside/shared';
import { type ReactNode, useState } from 'react';
import { MarginNote } from '../../components/margin-note';
import { PageCard } from '../../components/page-card';
import { standingOf } from '../../lib/standing';
import { useTimes } from '../../lib/times';
import { AskBack } from './ask-back';
import { type PhotoSlot, SayForm } from './say-form';
import { TalkLines } from './talk-lines';
import { type Talk, useTalk } from './use-talk';
import classes from './talk.module.css';

interface TalkCardProps {
  readonly sheet: Question;
  readonly me: Me;
  readonly people: SheetPresence['people'];
  readonly seenBefore: number;
  readonly hasEarlier: boolean;
  readonly onEarlier: () => Promise<void>;
  readonly onSent: (event: SheetEvent) => void;
  readonly onWriting: (on: boolean) => void;
  readonly photoSlot: PhotoSlot;
}

/** The live conversation under a question, as dated notes in the margin. */
export function TalkCard(props: TalkCardProps): ReactNode {
  const { sheet, me, people, seenBefore, hasEarlier, onEarlier, onSent, onWriting, photoSlot } = props;
  const talk = useTalk(sheet.id, onSent);
  const writing = people.filter((one) => one.writing && one.userId !== me.id).map(({ name }) => name);
  const mayTalk = canTalk(me, standingOf(sheet, me)) && sheet.state !== 'withdrawn';
  return (
    <PageCard title="Bench talk" aside={writingWords(writing)}>
      {hasEarlier && <Earlier onEarlier={onEarlier} />}
      <div role="log" aria-label="Bench talk">
        <TalkLines events={sheet.events} seenBefore={seenBefore} readerId={me.id} />
        <WaitingLines me={me} talk={talk} />
      </div>
      {mayTalk ? (
        <>
          <AskBack sheet={sheet} me={me} onAsk={(words) => talk.say(words, [])} />
          <SayForm questionId={sheet.id} onSay={talk.say} onWriting={onWriting} photoSlot={photoSlot} />
        </>
      ) : (
        <p className={classes['quiet']}>
          {sheet.state === 'withdrawn'
            ? 'This question was withdrawn.'
            : 'The bench talk is for members of the chapter.'}
        </p>
      )}
    </PageCard>
  );
}

function writingWords(names: readonly string[]): string | null {
  if (names.length === 0) return null;
  const first = names.map((name) => name.split(' ')[0]);
  return first.length === 1 ? `${first[0]} is writing…` : `${first.join(' and ')} are writing…`;
}

function Earlier({ onEarlier }: { readonly onEarlier: () => Promise<void> }): ReactNode {
  const [state, setState] = useState<'ready' | 'reading' | 'failed'>('ready');
  const read = () => {
    setState('reading');
    onEarlier().then(
      () => setState('ready'),
      () => setState('failed'),
    );
  };
  return (
    <p className={classes['earlier']}>
      <button
        type="button"
        className="btn plain"
        aria-disabled={state === 'reading' || undefined}
        onClick={read}
      >
        Show earlier talk
      </button>
      {state === 'failed' && <span role="alert">It could not be read just now.</span>}
    </p>
  );
}

/** Written here and not yet on the sheet: nothing typed is lost. */
function WaitingLines({ me, talk }: { readonly me: Me; readonly talk: Talk }): ReactNode {
  const { dateTime } = useTimes();
  return talk.waiting.map(({ key, body, at, refused }) => (
    <MarginNote key={key} name={me.name} when={dateTime(at)} waiting>
      {body}
      {refused === null ? (
        <p className="muted">on its way; kept on this device until it is there</p>
      ) : (
        <p role="alert" className={classes['fault']}>
          {refused}{' '}
          <button type="button" className="btn plain" onClick={() => talk.tryAgain(key)}>
            Try again
          </button>{' '}
          <button type="button" className="btn plain" onClick={() => talk.takeBack(key)}>
            Take it back
          </button>
        </p>
      )}
    </MarginNote>
  ));
}
