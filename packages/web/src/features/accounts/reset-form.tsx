import { PASSWORD_MIN, resetPasswordSchema } from '@rivetside/shared';
import { type ReactNode, useState } from 'react';
import { Link } from 'react-router-dom';
import { TextField } from '../../components/field';
import { api, Problem } from '../../lib/api';
import { Refusal, SendButton } from './form-parts';
import { useFormOf } from './use-form-of';
import classes from './accounts.module.css';

export function ResetForm({ token }: { readonly token: string }): ReactNode {
  const [isDone, setDone] = useState(false);
  const { field, handleSubmit, isSending, refusal } = useFormOf({
    initial: { password: '' },
    // The token comes with the link and has no field to be wrong at.
    schema: resetPasswordSchema.pick({ password: true }),
    send: async ({ password }) => {
      await api.post('/auth/reset-password', { body: { token, password } }).catch(whole);
      setDone(true);
    },
  });
  if (isDone)
    return (
      <p role="status" className={classes['done']}>
        Your password is changed, and whoever was signed in with the old one is signed out.{' '}
        <Link to="/sign-in">Sign in</Link>
      </p>
    );
  return (
    <form noValidate className={classes['form']} onSubmit={handleSubmit}>
      <Refusal>{refusal}</Refusal>
      <TextField
        {...field('password')}
        label="New password"
        type="password"
        autoComplete="new-password"
        hint={`${PASSWORD_MIN} characters or more.`}
      />
      <SendButton isSending={isSending}>Change the password</SendButton>
    </form>
  );
}

/** A fault of the link itself is told in full: there is no field to tell it at. */
function whole(error: unknown): never {
  const fault = error instanceof Problem ? error.errors.find(({ path }) => path === 'token') : undefined;
  throw fault ? new Problem({ status: 400, title: fault.message }) : error;
}
