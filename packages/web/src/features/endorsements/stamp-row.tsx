import {
  BASIS_WORDS,
  canReviewStamp,
  canWithdrawStamp,
  type Endorsement,
  type Fix,
  type Me,
} from '@rivetside/shared';
import { type ReactNode, useState } from 'react';
import { ReasonDialog } from '../../components/reason-dialog';
import { Stamp } from '../../components/stamp';
import { useTimes } from '../../lib/times';
import { stampWire } from './queries';
import { ReviewDialog } from './review-dialog';
import { scopeWords } from './scope-words';
import classes from './endorsements.module.css';

interface StampRowProps {
  readonly fix: Fix;
  readonly me: Me;
  /** The way to give one, or why the reader cannot. */
  readonly give: ReactNode;
}

/** Every stamp under a fix, given or taken back, each with what it says. */
export function StampRow({ fix, me, give }: StampRowProps): ReactNode {
  return (
    <div className={classes['stamps']}>
      {fix.endorsements.map((endorsement) => (
        <OneStamp key={endorsement.id} endorsement={endorsement} me={me} />
      ))}
      {give}
    </div>
  );
}

function OneStamp({ endorsement, me }: { readonly endorsement: Endorsement; readonly me: Me }): ReactNode {
  const { date } = useTimes();
  const { by, givenAt, goodUntil, basis, reference, scope, conditions, reason } = endorsement;
  return (
    <div className={classes['one']}>
      <Stamp stamp={endorsement} day={date(givenAt)} who={by.name} />
      <div className={classes['says']}>
        <p>
          {BASIS_WORDS[basis]}
          {reference ? `: ${reference}` : ''}; {scopeWords(scope)}; good until {date(goodUntil)}.
        </p>
        {conditions.length > 0 && (
          <p>
            <b>On condition:</b> {conditions.join('; ')}.
          </p>
        )}
        {reason && (
          <p className={classes['reason']}>
            <b>Given although a line is outside:</b> {reason}
          </p>
        )}
        <History endorsement={endorsement} />
        <StampActions endorsement={endorsement} me={me} />
      </div>
    </div>
  );
}

function History({
  endorsement: { held, withdrawn, state, reviews },
}: {
  readonly endorsement: Endorsement;
}): ReactNode {
  const { date } = useTimes();
  return (
    <>
      {reviews.map(({ at, by, decision, reason }) => (
        <p key={at} className="muted">
          Looked at again {date(at)} by {by.name}, {decision === 'keep' ? 'kept' : 'taken back'}: {reason}
        </p>
      ))}
      {held && state === 'held' && (
        <p className={classes['reason']}>
          On hold since {date(held.at)}: {held.reason}
        </p>
      )}
      {withdrawn && (
        <p className={classes['gone']}>
          Withdrawn {date(withdrawn.at)}: {withdrawn.reason}
        </p>
      )}
    </>
  );
}

function StampActions({
  endorsement,
  me,
}: {
  readonly endorsement: Endorsement;
  readonly me: Me;
}): ReactNode {
  const [open, setOpen] = useState<'withdraw' | 'review' | null>(null);
  const { id, by, state } = endorsement;
  const stamp = { byId: by.id };
  const mayReview = state === 'held' && canReviewStamp(me, stamp);
  const mayWithdraw = (state === 'live' || state === 'held') && canWithdrawStamp(me, stamp);
  if (!mayReview && !mayWithdraw) return null;
  const close = () => setOpen(null);
  return (
    <div className={classes['buttons']}>
      {mayReview && (
        <button type="button" className="btn" onClick={() => setOpen('review')}>
          Look at it again
        </button>
      )}
      {mayWithdraw && (
        <button type="button" className="btn plain" onClick={() => setOpen('withdraw')}>
          Withdraw the stamp
        </button>
      )}
      {open === 'withdraw' && (
        <ReasonDialog
          title="Withdraw a stamp"
          says="It stays on the sheet, struck, with your reason. Whoever carried the fix out gets an open item."
          send="Withdraw it"
          name={`withdraw-stamp:${id}`}
          onSend={(body, key) => stampWire.withdraw(id, body, key)}
          onClose={close}
        />
      )}
      {open === 'review' && <ReviewDialog endorsement={endorsement} onClose={close} />}
    </div>
  );
}
