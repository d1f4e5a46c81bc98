import { useId, type InputHTMLAttributes, type ReactNode, type SelectHTMLAttributes } from 'react';
import classes from './field.module.css';

/** What ties a control to its label, its hint and its fault. */
export interface ControlProps {
  readonly id: string;
  readonly 'aria-describedby': string | undefined;
  readonly 'aria-invalid': true | undefined;
}

interface FieldProps {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  readonly children: (control: ControlProps) => ReactNode;
}

/** A label, a control, and under it what was understood or what is wrong; both are read out with the control. */
export function Field({ label, hint, error, children }: FieldProps): ReactNode {
  const id = useId();
  const told = [error && `${id}error`, hint && `${id}hint`].filter(Boolean).join(' ');
  return (
    <div className={classes['field']}>
      <label htmlFor={id}>{label}</label>
      {children({ id, 'aria-describedby': told || undefined, 'aria-invalid': error ? true : undefined })}
      {error && (
        <p id={`${id}error`} className={classes['error']}>
          {error}
        </p>
      )}
      {hint && (
        <p id={`${id}hint`} className={classes['hint']}>
          {hint}
        </p>
      )}
    </div>
  );
}

type Native<A> = Omit<A, 'onChange' | 'value' | 'id'>;
interface Own {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly error?: string | undefined;
  readonly value: string;
  readonly onChange: (value: string) => void;
  /** The field's name among the faults, by which the summary finds it. */
  readonly field?: string | undefined;
}

export function TextField(props: Own & Native<InputHTMLAttributes<HTMLInputElement>>): ReactNode {
  const { label, hint, error, field, onChange, ...input } = props;
  return (
    <Field label={label} hint={hint} error={error}>
      {(control) => (
        <input
          {...input}
          {...control}
          data-field={field}
          className={`${classes['input']} ${input.className ?? ''}`}
          onChange={(event) => onChange(event.currentTarget.value)}
        />
      )}
    </Field>
  );
}

export interface Choice<V extends string = string> {
  readonly value: V;
  readonly label: string;
}

export function ChoiceField<V extends string>(
  props: Omit<Own, 'value' | 'onChange'> &
    Native<SelectHTMLAttributes<HTMLSelectElement>> & {
      readonly value: V;
      readonly onChange: (value: V) => void;
      readonly choices: readonly Choice<V>[];
    },
): ReactNode {
  const { label, hint, error, field, onChange, choices, ...select } = props;
  return (
    <Field label={label} hint={hint} error={error}>
      {(control) => (
        <select
          {...select}
          {...control}
          data-field={field}
          className={classes['input']}
          onChange={(event) => onChange(event.currentTarget.value as V)}
        >
          {choices.map(({ value, label: words }) => (
            <option key={value} value={value}>
              {words}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}

interface TickFieldProps {
  readonly label: ReactNode;
  readonly isOn: boolean;
  readonly onChange: (isOn: boolean) => void;
  readonly disabled?: boolean;
}

/** A box to tick, with a target as large as its words. */
export function TickField({ label, isOn, onChange, disabled }: TickFieldProps): ReactNode {
  return (
    <label className={classes['tick']}>
      <input
        type="checkbox"
        checked={isOn}
        disabled={disabled}
        onChange={(event) => onChange(event.currentTarget.checked)}
      />
      <span>{label}</span>
    </label>
  );
}

/** Puts the focus on the control of that name and brings it into view; false where there is none. */
export function focusField(field: string): boolean {
  const control = [...document.querySelectorAll<HTMLElement>('[data-field]')].find(
    (element) => element.dataset['field'] === field,
  );
  control?.focus();
  control?.scrollIntoView({ block: 'center' });
  return control !== undefined;
}
