import { type SyntheticEvent, useState } from 'react';
import type { z } from 'zod';
import { useDraft } from './drafts';
import { Problem, sentenceOf } from './problem';
import { randomKey } from './random-key';

export interface FormFault {
  /** Dotted path of the field; empty where it belongs to none. */
  readonly field: string;
  readonly message: string;
}

interface DraftFormOptions<T, Body, Answer> {
  /** The draft's name on this device. */
  readonly name: string;
  readonly initial: T;
  readonly schema: z.ZodType<Body, unknown>;
  /** What is sent, from what was typed; or why it cannot be read. */
  readonly read: (typed: T) => unknown;
  readonly send: (body: Body, key: string) => Promise<Answer>;
  readonly onSent: (answer: Answer) => void;
}

/**
 * A form whose typed values are kept on the device until the server has taken them. It is read by the schema that the
 * server reads it by, a repeated try carries the same key, and whatever is refused comes back at its field.
 */
export function useDraftForm<T, Body, Answer>(options: DraftFormOptions<T, Body, Answer>) {
  const { name, initial, schema, read, send, onSent } = options;
  const draft = useDraft(name, initial);
  const [faults, setFaults] = useState<readonly FormFault[]>([]);
  const [tries, setTries] = useState(0);
  const [isPending, setPending] = useState(false);
  const [key, setKey] = useState(randomKey);

  function refuse(next: readonly FormFault[]) {
    setFaults(next);
    setTries((count) => count + 1);
  }

  async function submit(event?: SyntheticEvent): Promise<void> {
    event?.preventDefault();
    if (isPending) return;
    const checked = schema.safeParse(read(draft.value));
    if (!checked.success) {
      refuse(checked.error.issues.map(({ path, message }) => ({ field: path.join('.'), message })));
      return;
    }
    setFaults([]);
    setPending(true);
    try {
      const answer = await send(checked.data, key);
      await draft.drop();
      onSent(answer);
    } catch (error) {
      // What is sent after a refusal is something else; after a broken connection it is the same again.
      if (!(error instanceof Problem && error.isOffline)) setKey(randomKey());
      refuse(faultsOf(error));
    } finally {
      setPending(false);
    }
  }

  return {
    ...draft,
    faults,
    tries,
    isPending,
    submit,
    errorOf: (field: string) => faults.find((fault) => fault.field === field)?.message,
  };
}

function faultsOf(error: unknown): FormFault[] {
  if (error instanceof Problem && error.errors.length > 0)
    return error.errors.map(({ path, message }) => ({ field: path, message }));
  return [{ field: '', message: sentenceOf(error) }];
}
