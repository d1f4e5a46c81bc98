import type { ReactNode } from 'react';
import { Field } from '../../components/field';
import fieldClasses from '../../components/field.module.css';
import dialogClasses from '../../components/dialog.module.css';
import classes from './fixes.module.css';

export interface TypedOperation {
  readonly text: string;
  readonly caution: string;
}

interface OperationFieldsProps {
  readonly operations: readonly TypedOperation[];
  readonly onChange: (operations: readonly TypedOperation[]) => void;
  readonly errorOf: (field: string) => string | undefined;
}

/** Operations numbered by their order: 10, 20, 30 … */
export function OperationFields({ operations, onChange, errorOf }: OperationFieldsProps): ReactNode {
  const replace = (at: number, facts: Partial<TypedOperation>) =>
    onChange(operations.map((one, index) => (index === at ? { ...one, ...facts } : one)));
  const move = (at: number, by: 1 | -1) => {
    const next = [...operations];
    [next[at], next[at + by]] = [next[at + by]!, next[at]!];
    onChange(next);
  };
  return (
    <fieldset className={dialogClasses['group']}>
      <legend>Operations</legend>
      {errorOf('operations') && <p className={fieldClasses['error']}>{errorOf('operations')}</p>}
      {operations.map(({ text, caution }, at) => {
        const no = (at + 1) * 10;
        return (
          <div key={at} className={classes['operation']}>
            <Field label={`Op ${no}`} error={errorOf(`operations.${at}.text`)}>
              {(control) => (
                <textarea
                  {...control}
                  data-field={`operations.${at}.text`}
                  className={fieldClasses['input']}
                  rows={2}
                  value={text}
                  onChange={(event) => replace(at, { text: event.currentTarget.value })}
                />
              )}
            </Field>
            <Field label={`Caution at op ${no}`} error={errorOf(`operations.${at}.caution`)}>
              {(control) => (
                <input
                  {...control}
                  data-field={`operations.${at}.caution`}
                  className={fieldClasses['input']}
                  value={caution}
                  onChange={(event) => replace(at, { caution: event.currentTarget.value })}
                />
              )}
            </Field>
            <div className={dialogClasses['buttons']}>
              <button type="button" className="btn plain" disabled={at === 0} onClick={() => move(at, -1)}>
                Earlier<span className="unseen">, op {no}</span>
              </button>
              <button
                type="button"
                className="btn plain"
                disabled={at === operations.length - 1}
                onClick={() => move(at, 1)}
              >
                Later<span className="unseen">, op {no}</span>
              </button>
              <button
                type="button"
                className="btn plain"
                onClick={() => onChange(operations.filter((_, index) => index !== at))}
              >
                Take out<span className="unseen"> op {no}</span>
              </button>
            </div>
          </div>
        );
      })}
      <div>
        <button
          type="button"
          className="btn plain"
          onClick={() => onChange([...operations, { text: '', caution: '' }])}
        >
          Add an operation
        </button>
      </div>
    </fieldset>
  );
}
