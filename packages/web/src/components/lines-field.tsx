import type { ReactNode } from 'react';
import { Field } from './field';
import classes from './field.module.css';

interface LinesFieldProps {
  readonly label: string;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  readonly value: string;
  readonly field: string;
  readonly onChange: (value: string) => void;
}

/** Several short texts, one a line. */
export function LinesField({ label, hint, error, value, field, onChange }: LinesFieldProps): ReactNode {
  return (
    <Field label={label} hint={hint} error={error}>
      {(control) => (
        <textarea
          {...control}
          data-field={field}
          className={classes['input']}
          rows={3}
          value={value}
          onChange={(event) => onChange(event.currentTarget.value)}
        />
      )}
    </Field>
  );
}

/** The lines that hold something. */
export function linesOf(text: string): string[] {
  return text
    .split('\n')
    .map((line) => line.trim())
    .filter(Boolean);
}
