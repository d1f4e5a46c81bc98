import { signInSchema } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { TextField } from '../../components/field';
import { session } from '../../lib/session';
import { Refusal, SendButton } from './form-parts';
import { useFormOf } from './use-form-of';
import classes from './accounts.module.css';

interface SignInFormProps {
  readonly onSignedIn: () => void;
  /** Whoever signs in again is known; nobody else may go on with their page. */
  readonly email?: string;
}

export function SignInForm({ onSignedIn, email }: SignInFormProps): ReactNode {
  const { field, handleSubmit, isSending, refusal } = useFormOf({
    initial: { email: email ?? '', password: '' },
    schema: signInSchema,
    send: async (typed) => {
      await session.signIn(typed);
      onSignedIn();
    },
  });
  return (
    <form noValidate className={classes['form']} onSubmit={handleSubmit}>
      <Refusal>{refusal}</Refusal>
      <TextField
        {...field('email')}
        label="E-mail"
        type="email"
        autoComplete="username"
        readOnly={email !== undefined}
      />
      <TextField
        {...field('password')}
        label="Password"
        type="password"
        autoComplete="current-password"
        data-autofocus={email !== undefined || undefined}
      />
      <SendButton isSending={isSending}>Sign in</SendButton>
    </form>
  );
}
