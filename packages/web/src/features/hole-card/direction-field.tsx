import type { ReactNode } from 'react';
import { ChoiceField, TextField } from '../../components/field';
import type { TypedAngle } from './hole-card-fields';

const NOT_TOLD = '';
const OTHER = 'other';
const EIGHTHS = [
  { value: '90', label: 'above' },
  { value: '270', label: 'below' },
  { value: '180', label: 'left' },
  { value: '0', label: 'right' },
  { value: '45', label: 'above right' },
  { value: '135', label: 'above left' },
  { value: '225', label: 'below left' },
  { value: '315', label: 'below right' },
] as const;
const CHOICES = [
  { value: NOT_TOLD, label: 'not told' },
  ...EIGHTHS,
  { value: OTHER, label: 'other, in degrees' },
];

/** The same in a word or two, for where the choice itself is put away. */
export function directionWords(angle: TypedAngle): string {
  const named = EIGHTHS.find(({ value }) => value === angle);
  if (named) return named.label;
  return angle.trim() ? `${angle.trim()}°` : 'side not told';
}

interface DirectionFieldProps {
  readonly label: string;
  readonly value: TypedAngle;
  readonly onChange: (value: TypedAngle) => void;
  readonly error?: string | undefined;
  readonly field?: string | undefined;
}

/** On which side something lies, seen with the row running from left to right; any other direction in degrees. */
export function DirectionField({ label, value, onChange, error, field }: DirectionFieldProps): ReactNode {
  const isNamed = value === NOT_TOLD || EIGHTHS.some((eighth) => eighth.value === value);
  const chosen = isNamed ? value : OTHER;
  // A blank that is not empty keeps "other" chosen until a number is typed.
  const handleChoice = (choice: string) => onChange(choice === OTHER ? ' ' : choice);
  return (
    <>
      <ChoiceField
        label={label}
        value={chosen}
        choices={CHOICES}
        onChange={handleChoice}
        field={isNamed ? field : undefined}
        error={isNamed ? error : undefined}
      />
      {!isNamed && (
        <TextField
          label={`${label}, degrees`}
          hint="Counter-clockwise from along the row: 90 is above."
          inputMode="decimal"
          value={value.trim()}
          field={field}
          error={error}
          onChange={(typed) => onChange(typed || ' ')}
        />
      )}
    </>
  );
}
