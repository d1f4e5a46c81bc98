import { useQuery } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';
import { sentenceOf } from '../../lib/problem';
import { session } from '../../lib/session';
import { Refusal } from './form-parts';
import { demoSignIns } from './queries';
import classes from './accounts.module.css';

/** Printed by the server at its start and no secret: the people of the demo exist nowhere else. */
const DEMO_PASSWORD = 'rivetside-demo';

export function DemoPeople({ onSignedIn }: { readonly onSignedIn: () => void }): ReactNode {
  const { data: people = [] } = useQuery(demoSignIns);
  const [refusal, setRefusal] = useState<string | null>(null);
  if (people.length === 0) return null;
  const enter = (email: string) => {
    setRefusal(null);
    session
      .signIn({ email, password: DEMO_PASSWORD })
      .then(onSignedIn)
      .catch((error: unknown) => setRefusal(sentenceOf(error)));
  };
  return (
    <section className={classes['demo']} aria-label="People of the demo">
      <h2>This is the demo. Sit down as one of these people:</h2>
      <Refusal>{refusal}</Refusal>
      <ul>
        {people.map(({ email, name, as }) => (
          <li key={email}>
            <button type="button" onClick={() => enter(email)}>
              <b>{name}</b>
              <span>{as}</span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}
