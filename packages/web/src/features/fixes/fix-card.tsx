import { FIX_KIND_WORDS, type Fix, type Me, type Question } from '@rivetside/shared';
import { type ReactNode, useId, useState } from 'react';
import { CheckLines } from '../../components/fit-check-lines';
import { ReasonDialog } from '../../components/reason-dialog';
import { Verdict } from '../../components/verdict';
import { useTimes } from '../../lib/times';
import { useUnits } from '../../lib/units';
import { checkWords, mayObjectTo, mayTakeBack } from './fix-words';
import { Objections } from './objections';
import { fixWire } from './queries';
import classes from './fixes.module.css';

interface FixCardProps {
  readonly sheet: Question;
  readonly fix: Fix;
  readonly me: Me;
  /** Its stamps and the way to give one: of another feature. */
  readonly stamps: ReactNode;
  /** The way to carry it out, for the builder. */
  readonly carryOut: ReactNode;
}

/** A fix as a shop traveller: numbered operations, each with its caution where it is needed. */
export function FixCard({ sheet, fix, me, stamps, carryOut }: FixCardProps): ReactNode {
  const heading = useId();
  const { dateTime } = useTimes();
  const { number, kind, summary, by, at, operations, conditions, withdrawn } = fix;
  return (
    <section
      className={classes['fix']}
      aria-labelledby={heading}
      data-withdrawn={withdrawn ? true : undefined}
    >
      <header className={classes['head']}>
        <div>
          <h2 id={heading}>{summary}</h2>
          <p className="muted">
            Fix {number} · {FIX_KIND_WORDS[kind].toLowerCase()} · {by.name}, mentor · {dateTime(at)}
          </p>
        </div>
        <FrozenCheck fix={fix} />
      </header>
      {withdrawn && (
        <p className={classes['struck']}>
          Withdrawn {dateTime(withdrawn.at)}: {withdrawn.reason}
        </p>
      )}
      <ol className={classes['operations']}>
        {operations.map(({ no, text, caution }) => (
          <li key={no}>
            <span className={classes['op']}>Op {no}</span>
            <div>
              {text}
              {caution && <p className={classes['caution']}>{caution}</p>}
            </div>
          </li>
        ))}
      </ol>
      {conditions.length > 0 && (
        <p className={classes['conditions']}>
          <b>On condition:</b> {conditions.join('; ')}.
        </p>
      )}
      {stamps}
      <Objections fix={fix} sheet={sheet} me={me} />
      <Actions sheet={sheet} fix={fix} me={me} carryOut={carryOut} />
    </section>
  );
}

/** The check as it stood when the fix was proposed; opens to its lines. */
function FrozenCheck({ fix: { check, engineVersion } }: { readonly fix: Fix }): ReactNode {
  const units = useUnits();
  const { verdict, words } = checkWords(check);
  if (!check || check.checks.length === 0) return <Verdict verdict={verdict}>{words}</Verdict>;
  return (
    <details className={classes['check']}>
      <summary>
        <Verdict verdict={verdict}>{words}</Verdict>
      </summary>
      <CheckLines lines={check.checks} units={units} />
      <p className="muted">
        Frozen when it was proposed, engine {engineVersion}. Inside published numbers is not approval.
      </p>
    </details>
  );
}

function Actions({ sheet, fix, me, carryOut }: Omit<FixCardProps, 'stamps'>): ReactNode {
  const [open, setOpen] = useState<'object' | 'withdraw' | null>(null);
  const mayObject = mayObjectTo(sheet, fix, me);
  const mayWithdraw = mayTakeBack(sheet, fix, me);
  if (!mayObject && !mayWithdraw && !carryOut) return null;
  const close = () => setOpen(null);
  return (
    <div className={classes['actions']}>
      {carryOut}
      {mayObject && (
        <button type="button" className="btn plain" onClick={() => setOpen('object')}>
          Object
        </button>
      )}
      {mayWithdraw && (
        <button type="button" className="btn plain" onClick={() => setOpen('withdraw')}>
          Withdraw the fix
        </button>
      )}
      {open === 'object' && (
        <ReasonDialog
          title="Object to this fix"
          says="Your reason is dated and shown. It blocks further stamps until it is answered, and puts what was stamped under review."
          send="Object"
          name={`object:${fix.id}`}
          onSend={(body, key) => fixWire.object(fix.id, body, key)}
          onClose={close}
        />
      )}
      {open === 'withdraw' && (
        <ReasonDialog
          title="Withdraw your fix"
          says="It stays readable, struck, with your reason."
          send="Withdraw it"
          name={`withdraw-fix:${fix.id}`}
          onSend={(body, key) => fixWire.withdraw(fix.id, body, key)}
          onClose={close}
        />
      )}
    </div>
  );
}
