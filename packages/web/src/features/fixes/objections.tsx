import { canAnswerObjection, type Fix, type Me, type Objection, type Question } from '@rivetside/shared';
import { type ReactNode, useState } from 'react';
import { ReasonDialog } from '../../components/reason-dialog';
import { standingOf } from '../../lib/standing';
import { useTimes } from '../../lib/times';
import { fixWire } from './queries';
import classes from './fixes.module.css';

interface ObjectionsProps {
  readonly fix: Fix;
  readonly sheet: Question;
  readonly me: Me;
}

/** Reasons against the fix, each with its answer or the way to give one. */
export function Objections({ fix, sheet, me }: ObjectionsProps): ReactNode {
  const mayAnswer = canAnswerObjection(me, standingOf(sheet, me));
  return fix.objections.map((objection) => (
    <OneObjection key={objection.id} objection={objection} mayAnswer={mayAnswer} />
  ));
}

function OneObjection({
  objection,
  mayAnswer,
}: {
  readonly objection: Objection;
  readonly mayAnswer: boolean;
}): ReactNode {
  const { dateTime } = useTimes();
  const [isOpen, setOpen] = useState(false);
  const { id, by, at, reason, answered } = objection;
  return (
    <div className={classes['objection']} data-open={answered === null || undefined}>
      <p>
        <b>Objection, {by.name}</b> <span className="muted">{dateTime(at)}</span>
        <br />
        {reason}
      </p>
      {answered ? (
        <p>
          <b>Answer, {answered.by.name}</b> <span className="muted">{dateTime(answered.at)}</span>
          <br />
          {answered.answer}
        </p>
      ) : mayAnswer ? (
        <button type="button" className="btn plain" onClick={() => setOpen(true)}>
          Answer it
        </button>
      ) : (
        <p className="muted">Waits for an answer; no stamps until then.</p>
      )}
      {isOpen && (
        <ReasonDialog
          title="Answer the objection"
          says={reason}
          label="Answer"
          send="Answer"
          name={`answer:${id}`}
          onSend={({ reason: answer }, key) => fixWire.answer(id, { answer }, key)}
          onClose={() => setOpen(false)}
        />
      )}
    </div>
  );
}
