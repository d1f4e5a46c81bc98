import { type ReasonBody, reasonBodySchema } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { useDraftForm } from '../lib/draft-form';
import { Dialog } from './dialog';
import classes from './dialog.module.css';
import { FaultSummary } from './fault-summary';
import { Field } from './field';
import fieldClasses from './field.module.css';
import { FormFoot } from './form-foot';

interface ReasonDialogProps {
  readonly title: string;
  /** What follows from it. */
  readonly says: ReactNode;
  readonly label?: string;
  readonly send: string;
  /** The draft's name on this device. */
  readonly name: string;
  readonly onSend: (body: ReasonBody, key: string) => Promise<unknown>;
  readonly onClose: () => void;
}

/** For what needs no more than a reason, which then stays beside it. */
export function ReasonDialog(props: ReasonDialogProps): ReactNode {
  const { title, says, label = 'Reason', send, name, onSend, onClose } = props;
  const form = useDraftForm({
    name,
    initial: '',
    schema: reasonBodySchema,
    read: (reason) => ({ reason }),
    send: onSend,
    onSent: onClose,
  });
  return (
    <Dialog title={title} onClose={onClose}>
      <form className={classes['form']} noValidate onSubmit={(event) => void form.submit(event)}>
        <FaultSummary
          title="It was not sent"
          faults={form.faults.filter(({ field }) => field === '')}
          tries={form.tries}
        />
        <p>{says}</p>
        <Field label={label} error={form.errorOf('reason') ?? form.errorOf('answer')}>
          {(control) => (
            <textarea
              {...control}
              data-autofocus
              data-field="reason"
              className={fieldClasses['input']}
              rows={4}
              maxLength={2_000}
              readOnly={!form.loaded}
              value={form.value}
              onChange={(event) => form.set(event.currentTarget.value)}
            />
          )}
        </Field>
        <FormFoot send={send} isPending={form.isPending} onLater={onClose} />
      </form>
    </Dialog>
  );
}
