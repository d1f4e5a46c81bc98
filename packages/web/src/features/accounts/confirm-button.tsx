import { type ReactNode, useState } from 'react';
import { Link } from 'react-router-dom';
import { api } from '../../lib/api';
import { Problem, sentenceOf } from '../../lib/problem';
import { Refusal } from './form-parts';
import classes from './accounts.module.css';

/** Pressed by a person: mail scanners open links, and an address must not be confirmed by one. */
export function ConfirmButton({ token }: { readonly token: string }): ReactNode {
  const [state, setState] = useState<'asked' | 'sending' | 'done'>('asked');
  const [refusal, setRefusal] = useState<string | null>(null);
  const confirm = async () => {
    setState('sending');
    setRefusal(null);
    try {
      await api.post('/auth/confirm-email', { body: { token } });
      setState('done');
    } catch (error) {
      const fault = error instanceof Problem ? error.errors[0]?.message : undefined;
      setRefusal(fault ?? sentenceOf(error));
      setState('asked');
    }
  };
  if (state === 'done')
    return (
      <p role="status" className={classes['done']}>
        Your e-mail address is confirmed. <Link to="/sign-in">Sign in</Link>
      </p>
    );
  return (
    <div className={classes['form']}>
      <Refusal>{refusal}</Refusal>
      <button
        type="button"
        className="btn"
        aria-disabled={state === 'sending' || undefined}
        onClick={() => state === 'asked' && void confirm()}
      >
        Confirm this address
      </button>
    </div>
  );
}
