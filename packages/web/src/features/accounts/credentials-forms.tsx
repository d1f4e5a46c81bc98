import { changeEmailSchema, changePasswordSchema, mailSentSchema, PASSWORD_MIN } from '@rivetside/shared';
import { useQueryClient } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';
import { TextField } from '../../components/field';
import { api } from '../../lib/api';
import { Kept } from './about-you-form';
import { Refusal, SendButton } from './form-parts';
import { ownSessions } from './queries';
import { useFormOf } from './use-form-of';
import classes from './accounts.module.css';

export function EmailForm({ email }: { readonly email: string }): ReactNode {
  const [answer, setAnswer] = useState<string | null>(null);
  const { field, handleSubmit, isSending, refusal, reset } = useFormOf({
    initial: { email: '', password: '' },
    schema: changeEmailSchema,
    send: async (typed) => {
      const { message } = await api.post('/me/email', { body: typed, answer: mailSentSchema });
      setAnswer(message);
      reset();
    },
  });
  return (
    <form noValidate className={classes['form']} onSubmit={handleSubmit} onChange={() => setAnswer(null)}>
      <Refusal>{refusal}</Refusal>
      <TextField
        {...field('email')}
        label="New e-mail"
        type="email"
        autoComplete="email"
        hint={`Now ${email}. It changes once you open the link sent to the new address.`}
      />
      <TextField
        {...field('password')}
        label="Your password"
        type="password"
        autoComplete="current-password"
      />
      <SendButton isSending={isSending}>Change the e-mail</SendButton>
      <Kept isKept={answer !== null}>{answer}</Kept>
    </form>
  );
}

export function PasswordForm(): ReactNode {
  const [isKept, setKept] = useState(false);
  const queryClient = useQueryClient();
  const { field, handleSubmit, isSending, refusal, reset } = useFormOf({
    initial: { password: '', newPassword: '' },
    schema: changePasswordSchema,
    send: async (typed) => {
      await api.post('/me/password', { body: typed });
      await queryClient.invalidateQueries({ queryKey: ownSessions.queryKey });
      setKept(true);
      reset();
    },
  });
  return (
    <form noValidate className={classes['form']} onSubmit={handleSubmit} onChange={() => setKept(false)}>
      <Refusal>{refusal}</Refusal>
      <TextField
        {...field('password')}
        label="Password now"
        type="password"
        autoComplete="current-password"
      />
      <TextField
        {...field('newPassword')}
        label="New password"
        type="password"
        autoComplete="new-password"
        hint={`${PASSWORD_MIN} characters or more.`}
      />
      <SendButton isSending={isSending}>Change the password</SendButton>
      <Kept isKept={isKept}>Changed. Every other device is signed out.</Kept>
    </form>
  );
}
