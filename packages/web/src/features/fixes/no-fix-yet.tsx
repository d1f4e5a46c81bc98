import type { Question } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { PageCard } from '../../components/page-card';
import classes from './fixes.module.css';

interface NoFixYetProps {
  readonly sheet: Question;
  /** Why a mentor who reads this cannot propose; null where there is nothing to explain. */
  readonly whyNot: string | null;
  readonly onPropose: (() => void) | undefined;
}

const WAITS: Readonly<Record<Question['waits']['for'], string>> = {
  firstFix: 'Nobody has proposed a fix yet. Do not drill while it is open.',
  stamp: 'A fix waits for a stamp. Do not drill until it is endorsed.',
  secondStamp: 'This section is critical: the fix waits for a second stamp, not on experience.',
  builder: 'Endorsed: the builder carries it out.',
  kitMaker: 'The question waits for the kit maker.',
  review: 'Under review: wait until it is decided before the next rivet goes in.',
  nothing: '',
};

/** What the question waits for, and the way to propose a fix. */
export function NoFixYet({ sheet, whyNot, onPropose }: NoFixYetProps): ReactNode {
  const words = WAITS[sheet.waits.for];
  if (!words && !onPropose) return null;
  return (
    <PageCard title={sheet.fixes.length === 0 ? 'Fixes' : 'What it waits for'}>
      <div className={classes['done']}>
        {words && <p>{words}</p>}
        {whyNot && !onPropose && <p className="muted">{whyNot}</p>}
        {onPropose && (
          <div>
            <button
              type="button"
              className={sheet.fixes.length === 0 ? 'btn' : 'btn plain'}
              onClick={onPropose}
            >
              {sheet.fixes.length === 0 ? 'Propose a fix' : 'Propose another fix'}
            </button>
          </div>
        )}
      </div>
    </PageCard>
  );
}
