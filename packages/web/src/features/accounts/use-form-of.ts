import { schemaResolver, useForm } from '@mantine/form';
import { useState } from 'react';
import { focusField } from '../../components/field';
import { Problem, sentenceOf } from '../../lib/problem';

type Typed = Record<string, string>;

interface FormOf<T extends Typed> {
  readonly initial: T;
  readonly schema: Parameters<typeof schemaResolver>[0];
  readonly send: (typed: T) => Promise<void>;
}

/**
 * A form of text fields: judged by the shared schema before anything is sent, refused by the server at the field where
 * it names one and above the form otherwise. What was typed stays.
 */
export function useFormOf<T extends Typed>({ initial, schema, send }: FormOf<T>) {
  const form = useForm<Typed>({ initialValues: initial, validate: schemaResolver(schema, { sync: true }) });
  const [isSending, setSending] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);

  const refuse = (error: unknown) => {
    const faults = error instanceof Problem ? error.errors.filter(({ path }) => path in initial) : [];
    form.setErrors(Object.fromEntries(faults.map(({ path, message }) => [path, message])));
    if (faults[0]) focusField(faults[0].path);
    else setRefusal(sentenceOf(error));
  };
  const handleSubmit = form.onSubmit(
    async (typed) => {
      if (isSending) return;
      setRefusal(null);
      setSending(true);
      await send(typed as T)
        .catch(refuse)
        .finally(() => setSending(false));
    },
    (errors) => focusField(Object.keys(errors)[0] ?? ''),
  );
  const field = (name: keyof T & string) => ({
    name,
    field: name,
    value: form.values[name] ?? '',
    error: form.errors[name] ? String(form.errors[name]) : undefined,
    onChange: (value: string) => form.setFieldValue(name, value as never),
  });
  return { field, handleSubmit, isSending, refusal, reset: form.reset };
}
