import { type Endorsement, type ReviewStamp, reviewStampSchema } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Dialog } from '../../components/dialog';
import dialogClasses from '../../components/dialog.module.css';
import { FaultSummary } from '../../components/fault-summary';
import { FormFoot } from '../../components/form-foot';
import { LinesField } from '../../components/lines-field';
import { useDraftForm } from '../../lib/draft-form';
import { stampWire } from './queries';

type Decision = ReviewStamp['decision'];
const DECISIONS: Readonly<Record<Decision, string>> = {
  keep: 'Keep it: the fix stands as it is',
  change: 'Change: this stamp goes, a changed fix gets a new one',
  withdraw: 'Withdraw it: the ground is gone',
};
const BLANK: { readonly decision: Decision | null; readonly reason: string } = { decision: null, reason: '' };

interface ReviewDialogProps {
  readonly endorsement: Endorsement;
  readonly onClose: () => void;
}

/** Another look at a stamp on hold. */
export function ReviewDialog({ endorsement: { id, held }, onClose }: ReviewDialogProps): ReactNode {
  const form = useDraftForm({
    name: `review:${id}`,
    initial: BLANK,
    schema: reviewStampSchema,
    read: ({ decision, reason }) => ({ decision: decision ?? undefined, reason }),
    send: (body, key) => stampWire.review(id, body, key),
    onSent: onClose,
  });
  return (
    <Dialog title="Look at your stamp again" onClose={onClose}>
      <form className={dialogClasses['form']} noValidate onSubmit={(event) => void form.submit(event)}>
        <FaultSummary title="It was not sent" faults={form.faults} tries={form.tries} />
        {held && <p className={dialogClasses['note']}>{held.reason}</p>}
        <fieldset className={dialogClasses['group']}>
          <legend>What becomes of it</legend>
          {(Object.keys(DECISIONS) as Decision[]).map((decision) => (
            <label key={decision} className={dialogClasses['choice']}>
              <input
                type="radio"
                name="decision"
                data-field="decision"
                checked={form.value.decision === decision}
                onChange={() => form.set((old) => ({ ...old, decision }))}
              />
              <span>{DECISIONS[decision]}</span>
            </label>
          ))}
        </fieldset>
        <LinesField
          label="Reason"
          field="reason"
          value={form.value.reason}
          error={form.errorOf('reason')}
          onChange={(reason) => form.set((old) => ({ ...old, reason }))}
        />
        <FormFoot send="Decide" isPending={form.isPending} onLater={onClose} />
      </form>
    </Dialog>
  );
}
