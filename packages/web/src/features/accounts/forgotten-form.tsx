import { forgotPasswordSchema, mailSentSchema } from '@rivetside/shared';
import { type ReactNode, useState } from 'react';
import { TextField } from '../../components/field';
import { api } from '../../lib/api';
import { Refusal, SendButton } from './form-parts';
import { useFormOf } from './use-form-of';
import classes from './accounts.module.css';

export function ForgottenForm(): ReactNode {
  const [answer, setAnswer] = useState<string | null>(null);
  const { field, handleSubmit, isSending, refusal } = useFormOf({
    initial: { email: '' },
    schema: forgotPasswordSchema,
    send: async (typed) => {
      const { message } = await api.post('/auth/forgot-password', { body: typed, answer: mailSentSchema });
      setAnswer(message);
    },
  });
  if (answer !== null)
    return (
      <p role="status" className={classes['done']}>
        {answer}
      </p>
    );
  return (
    <form noValidate className={classes['form']} onSubmit={handleSubmit}>
      <Refusal>{refusal}</Refusal>
      <TextField {...field('email')} label="E-mail" type="email" autoComplete="username" />
      <SendButton isSending={isSending}>Send the link</SendButton>
    </form>
  );
}
