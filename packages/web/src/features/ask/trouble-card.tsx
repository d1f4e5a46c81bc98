import {
  DISCIPLINE_WORDS,
  DISCIPLINES,
  MISHAP_WORDS,
  MISHAPS,
  QUESTION_TITLE_MAX,
  type Discipline,
  type Mishap,
} from '@rivetside/shared';
import { useId, type ReactNode } from 'react';
import { ChoiceField, Field, TextField } from '../../components/field';
import fieldClasses from '../../components/field.module.css';
import { withMishap, type AskDraft } from './ask-draft';
import classes from './ask.module.css';

interface TroubleCardProps<D extends AskDraft> {
  readonly draft: D;
  readonly onChange: (draft: D) => void;
  readonly errors: Readonly<Record<string, string>>;
}

function MishapChoice({
  value,
  onChange,
  error,
}: {
  value: Mishap | null;
  onChange: (mishap: Mishap) => void;
  error: string | undefined;
}): ReactNode {
  const name = useId();
  return (
    <fieldset className={classes['mishaps']} aria-describedby={error ? `${name}error` : undefined}>
      <legend>What kind of trouble</legend>
      {MISHAPS.map((mishap, index) => (
        <label key={mishap}>
          <input
            type="radio"
            name={name}
            checked={value === mishap}
            data-field={index === 0 ? 'mishap' : undefined}
            onChange={() => onChange(mishap)}
          />
          <span>{MISHAP_WORDS[mishap]}</span>
        </label>
      ))}
      {error && (
        <p id={`${name}error`} className={fieldClasses['error']}>
          {error}
        </p>
      )}
    </fieldset>
  );
}

/** What is wrong: the kind of trouble, whose field of work it is, in one line, and in full. */
export function TroubleCard<D extends AskDraft>({ draft, onChange, errors }: TroubleCardProps<D>): ReactNode {
  return (
    <div className={classes['stackOfFields']}>
      <MishapChoice
        value={draft.mishap}
        error={errors['mishap']}
        onChange={(mishap) => onChange(withMishap(draft, mishap))}
      />
      <TextField
        label="In one line"
        value={draft.title}
        maxLength={QUESTION_TITLE_MAX}
        placeholder="Hole 7 in the doubler will not line up with the spar"
        field="title"
        error={errors['title']}
        onChange={(title) => onChange({ ...draft, title })}
      />
      <Field
        label="What you see, and what you have done so far"
        error={errors['body']}
        hint="Say what was not touched yet too."
      >
        {(control) => (
          <textarea
            {...control}
            className={fieldClasses['input']}
            rows={5}
            data-field="body"
            value={draft.body}
            onChange={(event) => onChange({ ...draft, body: event.currentTarget.value })}
          />
        )}
      </Field>
      <div className={classes['three']}>
        <ChoiceField
          label="Field of work"
          hint="Mentors who hold it are asked. It follows from the trouble; change it where you know better."
          value={draft.discipline ?? ''}
          field="discipline"
          error={errors['discipline']}
          choices={[
            { value: '', label: 'follows from the trouble' },
            ...DISCIPLINES.map((one) => ({ value: one as string, label: DISCIPLINE_WORDS[one] })),
          ]}
          onChange={(choice) =>
            onChange({
              ...draft,
              discipline: (choice || null) as Discipline | null,
              isDisciplineChosen: choice !== '',
            })
          }
        />
      </div>
    </div>
  );
}
