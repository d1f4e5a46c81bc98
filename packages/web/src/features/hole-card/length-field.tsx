import type { Units } from '@rivetside/shared';
import { useState, type ReactNode } from 'react';
import { Field } from '../../components/field';
import type { TypedLength } from './hole-card-fields';
import classes from './hole-card.module.css';
import { TOOLS, TOOL_WORDS, type Tool } from './measuring-tools';
import { readTyped, understood } from './typed-length';

interface LengthFieldProps {
  readonly label: ReactNode;
  readonly value: TypedLength;
  readonly onChange: (value: TypedLength) => void;
  /** The reader's units: a bare number typed now is in them. */
  readonly units: Units;
  readonly error?: string | undefined;
  /** What was reckoned from it, where it is not what goes on the card. */
  readonly note?: string | undefined;
  /** Which way it was measured, where the choice of it is put away. */
  readonly way?: string | undefined;
  readonly field?: string | undefined;
  readonly placeholder?: string | undefined;
  /** A hole has the drill's name beside it. */
  readonly isHole?: boolean;
  /** What it was measured with can be told. */
  readonly withTool?: boolean;
}

function ToolChoice({ value, onChange, label }: LengthFieldProps): ReactNode {
  const reading = readTyped(value);
  if (reading.kind === 'read' && reading.isErrorTyped)
    return <span className={classes['unit']}>± typed</span>;
  if (reading.kind === 'read' && reading.drill) return <span className={classes['unit']}>drill</span>;
  const name = typeof label === 'string' ? label : 'This length';
  return (
    <select
      className={classes['tool']}
      aria-label={`${name}: measured with`}
      value={value.tool}
      onChange={(event) => onChange({ ...value, tool: event.currentTarget.value as Tool })}
    >
      {TOOLS.map((tool) => (
        <option key={tool} value={tool}>
          {TOOL_WORDS[tool]}
        </option>
      ))}
    </select>
  );
}

/** What was understood is worth a line only where it is not what was typed. */
function news({ typed }: TypedLength, words: string): string {
  return words === `${typed.trim()} in` || words === `${typed.trim()} mm` ? '' : words;
}

/**
 * A length as builders type it: inch decimals, fractions, drill names, millimetres, ±. What was understood stands
 * under it; what was typed is never changed. A fault is told when the hand has left the field, not while it is typing.
 */
export function LengthField(props: LengthFieldProps): ReactNode {
  const { label, value, onChange, units, error, note, way, field, isHole = false, withTool = true } = props;
  const [isTyping, setTyping] = useState(false);
  const words = [way, note ?? news(value, understood(value, units, isHole))].filter(Boolean).join(' · ');
  return (
    <Field label={label} hint={words || undefined} error={isTyping ? undefined : error}>
      {(control) => (
        <div className={classes['length']} data-invalid={control['aria-invalid']}>
          <input
            {...control}
            data-field={field}
            value={value.typed}
            placeholder={props.placeholder}
            inputMode="text"
            autoComplete="off"
            autoCapitalize="off"
            spellCheck={false}
            onFocus={() => setTyping(true)}
            onBlur={() => setTyping(false)}
            onChange={(event) => onChange({ ...value, typed: event.currentTarget.value, units })}
          />
          {withTool ? (
            <ToolChoice {...props} />
          ) : (
            <span className={classes['unit']}>{units === 'mm' ? 'mm' : 'in'}</span>
          )}
        </div>
      )}
    </Field>
  );
}
