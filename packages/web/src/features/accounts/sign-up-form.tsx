import { mailSentSchema, PASSWORD_MIN, signUpSchema } from '@rivetside/shared';
import { type ReactNode, useState } from 'react';
import { TextField } from '../../components/field';
import { api } from '../../lib/api';
import { Refusal, SendButton } from './form-parts';
import { useFormOf } from './use-form-of';
import classes from './accounts.module.css';

export function SignUpForm(): ReactNode {
  const [answer, setAnswer] = useState<string | null>(null);
  const { field, handleSubmit, isSending, refusal } = useFormOf({
    initial: { name: '', email: '', password: '' },
    schema: signUpSchema,
    send: async (typed) => {
      const { message } = await api.post('/auth/sign-up', { body: typed, answer: mailSentSchema });
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
      <TextField
        {...field('name')}
        label="Name"
        autoComplete="name"
        hint="As others know you: it stands beside what you write, dated."
      />
      <TextField {...field('email')} label="E-mail" type="email" autoComplete="username" />
      <TextField
        {...field('password')}
        label="Password"
        type="password"
        autoComplete="new-password"
        hint={`${PASSWORD_MIN} characters or more; a few words that only you put together will do.`}
      />
      <SendButton isSending={isSending}>Make an account</SendButton>
    </form>
  );
}
