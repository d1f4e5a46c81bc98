import type { Units } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { ChoiceField } from '../../components/field';
import type { Placed, PlacedBy } from './hole-card-fields';
import { LengthField } from './length-field';
import { PLACED_WORDS } from './placed';

interface PlacedFieldProps<P extends Placed> {
  readonly label: string;
  readonly value: P;
  readonly onChange: (value: P) => void;
  readonly units: Units;
  readonly error?: string | undefined;
  readonly note?: string | undefined;
  readonly field?: string | undefined;
  readonly placeholder?: string | undefined;
}

const WAYS = (Object.keys(PLACED_WORDS) as PlacedBy[]).map((by) => ({ value: by, label: PLACED_WORDS[by] }));

/** How far and which way a thing lies from the first hole: along the row, square to it, or both. */
export function PlacedField<P extends Placed>(props: PlacedFieldProps<P>): ReactNode {
  const { label, value, onChange, units, field } = props;
  const shared = { units, error: props.error, note: props.note, field };
  return (
    <>
      {value.by === 'xy' ? (
        <>
          <LengthField
            {...shared}
            label={`${label}, along`}
            value={value.x}
            onChange={(x) => onChange({ ...value, x })}
          />
          <LengthField
            {...shared}
            field={undefined}
            error={undefined}
            label={`${label}, across`}
            value={value.y}
            onChange={(y) => onChange({ ...value, y })}
          />
        </>
      ) : (
        <LengthField
          {...shared}
          label={label}
          placeholder={props.placeholder}
          value={value.away}
          onChange={(away) => onChange({ ...value, away })}
        />
      )}
      <ChoiceField
        label="Which way"
        value={value.by}
        choices={WAYS}
        onChange={(by) => onChange({ ...value, by })}
      />
    </>
  );
}
