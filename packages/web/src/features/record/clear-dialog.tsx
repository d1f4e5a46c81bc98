import { clearOpenItemSchema, type OpenItem } from '@rivetside/shared';
import { type ReactNode, type SyntheticEvent, useState } from 'react';
import { Dialog } from '../../components/dialog';
import { Field } from '../../components/field';
import fieldClasses from '../../components/field.module.css';
import { useDraft } from '../../lib/drafts';
import { Problem, sentenceOf } from '../../lib/problem';
import { useClearOpenItem } from './queries';
import classes from './record.module.css';

interface ClearDialogProps {
  readonly item: OpenItem;
  readonly onClose: () => void;
  readonly onCleared: (item: OpenItem) => void;
}

/** An item is cleared by saying what was done; the words stay on the device until they are sent. */
export function ClearDialog({ item, onClose, onCleared }: ClearDialogProps): ReactNode {
  return (
    <Dialog title="Clear an open item" onClose={onClose}>
      <ClearForm item={item} onClose={onClose} onCleared={onCleared} />
    </Dialog>
  );
}

function ClearForm({ item, onClose, onCleared }: ClearDialogProps): ReactNode {
  const draft = useDraft(`clear:${item.id}`, '');
  const clear = useClearOpenItem(item);
  const [fault, setFault] = useState<string>();
  const handleSubmit = (event: SyntheticEvent) => {
    event.preventDefault();
    const read = clearOpenItemSchema.safeParse({ note: draft.value });
    setFault(read.error?.issues[0]?.message);
    if (!read.success || clear.isPending) return;
    clear.mutate(read.data, {
      onSuccess: () => {
        void draft.drop();
        onCleared(item);
      },
    });
  };
  return (
    <form className={classes['form']} noValidate onSubmit={handleSubmit}>
      <p>{item.text}</p>
      <Field
        label="What was done"
        hint="It stays beside the item in your record."
        error={fault ?? told(clear.error)}
      >
        {(control) => (
          <textarea
            {...control}
            data-autofocus
            className={fieldClasses['input']}
            rows={4}
            maxLength={2_000}
            readOnly={!draft.loaded}
            value={draft.value}
            onChange={(event) => draft.set(event.currentTarget.value)}
          />
        )}
      </Field>
      {clear.error && !told(clear.error) && (
        <p role="alert" className={classes['refusal']}>
          {sentenceOf(clear.error)}
        </p>
      )}
      <div className={classes['buttons']}>
        <button type="submit" className="btn" aria-disabled={clear.isPending || undefined}>
          Clear it
        </button>
        <button type="button" className="btn plain" onClick={onClose}>
          Not yet
        </button>
      </div>
    </form>
  );
}

/** What the server says of the note itself belongs at the note. */
function told(error: unknown): string | undefined {
  return error instanceof Problem ? error.errors.find(({ path }) => path === 'note')?.message : undefined;
}
