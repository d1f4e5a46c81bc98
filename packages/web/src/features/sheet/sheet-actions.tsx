import {
  canRefer,
  canWithdrawQuestion,
  type Me,
  type Question,
  type Referral,
  referralAnswerSchema,
  referSchema,
  takesAdvice,
} from '@rivetside/shared';
import { type ReactNode, useState } from 'react';
import { Dialog } from '../../components/dialog';
import dialogClasses from '../../components/dialog.module.css';
import { FaultSummary } from '../../components/fault-summary';
import { TextField } from '../../components/field';
import { FormFoot } from '../../components/form-foot';
import { LinesField } from '../../components/lines-field';
import { PageCard } from '../../components/page-card';
import { ReasonDialog } from '../../components/reason-dialog';
import { useDraftForm } from '../../lib/draft-form';
import { standingOf } from '../../lib/standing';
import { useTimes } from '../../lib/times';
import { sheetWire } from './queries';
import classes from './sheet.module.css';

interface SheetActionsProps {
  readonly sheet: Question;
  readonly me: Me;
}

type Way = 'refer' | 'answer' | 'withdraw';
const WAY_WORDS: Readonly<Record<Way, string>> = {
  refer: 'Refer to the kit maker',
  answer: 'File the answer',
  withdraw: 'Withdraw the question',
};

const waits = ({ referral }: Question) => referral !== null && referral.answered === null;

/** What the reader may do with the question as a whole. */
function waysOf(sheet: Question, me: Me): Way[] {
  const standing = standingOf(sheet, me);
  const mayRefer = canRefer(me, standing);
  if (!takesAdvice(standing)) return waits(sheet) && mayRefer ? ['answer'] : [];
  const withdraw: Way[] = canWithdrawQuestion(me, standing) ? ['withdraw'] : [];
  return mayRefer ? [waits(sheet) ? 'answer' : 'refer', ...withdraw] : withdraw;
}

/** Referring to the kit maker, filing the answer back, and withdrawing the question. */
export function SheetActions({ sheet, me }: SheetActionsProps): ReactNode {
  const [open, setOpen] = useState<Way | null>(null);
  const ways = waysOf(sheet, me);
  if (!sheet.referral && ways.length === 0) return null;
  return (
    <PageCard title="Kit maker" aside={waits(sheet) ? 'waits for the answer' : null}>
      {sheet.referral && <ReferralWords referral={sheet.referral} />}
      <div className={classes['actions']}>
        {ways.map((way) => (
          <button
            key={way}
            type="button"
            className={way === 'answer' ? 'btn' : 'btn plain'}
            onClick={() => setOpen(way)}
          >
            {WAY_WORDS[way]}
          </button>
        ))}
      </div>
      {open && <WayDialog way={open} sheet={sheet} onClose={() => setOpen(null)} />}
    </PageCard>
  );
}

function WayDialog({ way, sheet, onClose }: OwnDialogProps & { readonly way: Way }): ReactNode {
  if (way === 'refer') return <ReferDialog sheet={sheet} onClose={onClose} />;
  if (way === 'answer') return <AnswerDialog sheet={sheet} onClose={onClose} />;
  return (
    <ReasonDialog
      title="Withdraw the question"
      says="It stays readable with your reason; nothing more is advised on it."
      send="Withdraw it"
      name={`withdraw:${sheet.id}`}
      onSend={(body, key) => sheetWire.withdraw(sheet.id, body, key)}
      onClose={onClose}
    />
  );
}

function ReferralWords({ referral: { by, at, note, answered } }: { readonly referral: Referral }): ReactNode {
  const { dateTime } = useTimes();
  return (
    <div className={classes['done']}>
      <p>
        Sent by {by.name}, {dateTime(at)}
        {note ? `: ${note}` : '.'}
      </p>
      {answered && (
        <p>
          <b>Answer, {answered.reference}</b>{' '}
          <span className="muted">
            filed by {answered.by.name}, {dateTime(answered.at)}
          </span>
          <br />
          {answered.answer}
        </p>
      )}
    </div>
  );
}

interface OwnDialogProps {
  readonly sheet: Question;
  readonly onClose: () => void;
}

function ReferDialog({ sheet, onClose }: OwnDialogProps): ReactNode {
  const form = useDraftForm({
    name: `refer:${sheet.id}`,
    initial: '',
    schema: referSchema,
    read: (note) => (note.trim() ? { note } : {}),
    send: (body, key) => sheetWire.refer(sheet.id, body, key),
    onSent: onClose,
  });
  return (
    <Dialog title="Refer to the kit maker" onClose={onClose}>
      <form className={dialogClasses['form']} noValidate onSubmit={(event) => void form.submit(event)}>
        <FaultSummary title="It was not sent" faults={form.faults} tries={form.tries} />
        <p>
          Send the kit maker this sheet: its drawing, numbers and photos. The question then waits for the
          answer, which you file here with its reference.
        </p>
        <LinesField
          label="What you ask them"
          field="note"
          value={form.value}
          error={form.errorOf('note')}
          onChange={form.set}
        />
        <FormFoot send="Mark as referred" isPending={form.isPending} onLater={onClose} />
      </form>
    </Dialog>
  );
}

const NO_ANSWER = { answer: '', reference: '' };

function AnswerDialog({ sheet, onClose }: OwnDialogProps): ReactNode {
  const form = useDraftForm({
    name: `referral-answer:${sheet.id}`,
    initial: NO_ANSWER,
    schema: referralAnswerSchema,
    read: (typed) => typed,
    send: (body, key) => sheetWire.answerReferral(sheet.id, body, key),
    onSent: onClose,
  });
  const change = (facts: Partial<typeof NO_ANSWER>) => form.set((old) => ({ ...old, ...facts }));
  return (
    <Dialog title="File the kit maker’s answer" onClose={onClose}>
      <form className={dialogClasses['form']} noValidate onSubmit={(event) => void form.submit(event)}>
        <FaultSummary title="It was not filed" faults={form.faults} tries={form.tries} />
        <LinesField
          label="What they answered"
          field="answer"
          value={form.value.answer}
          error={form.errorOf('answer')}
          onChange={(answer) => change({ answer })}
        />
        <TextField
          label="Reference"
          hint="the number and date on the answer: a stamp can rest on it"
          field="reference"
          value={form.value.reference}
          error={form.errorOf('reference')}
          onChange={(reference) => change({ reference })}
        />
        <FormFoot send="File it" isPending={form.isPending} onLater={onClose} />
      </form>
    </Dialog>
  );
}
