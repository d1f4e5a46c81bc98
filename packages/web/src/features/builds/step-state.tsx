import type { Step } from '@rivetside/shared';
import type { ReactNode } from 'react';
import classes from './step-state.module.css';

type State = 'todo' | 'pinned' | 'driven';
const WORDS: Readonly<Record<State, string>> = { todo: 'to do', pinned: 'pinned', driven: 'driven' };

interface StepStateProps {
  readonly step: Step;
  /** null until it is known. */
  readonly state: State | null;
  readonly onSet: (state: State) => void;
}

/** How far one's own build has come in a step; by thumb or by keys. */
export function StepState({ step, state, onSet }: StepStateProps): ReactNode {
  return (
    <fieldset className={classes['states']} disabled={state === null}>
      <legend className="unseen">Step {step.number} on my build</legend>
      {(Object.keys(WORDS) as State[]).map((one) => (
        <label key={one}>
          <input type="radio" name={step.id} checked={one === state} onChange={() => onSet(one)} />
          <span>{WORDS[one]}</span>
        </label>
      ))}
    </fieldset>
  );
}
