import type { Units } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { ChoiceField } from '../../components/field';
import type { Placed, PlacedBy } from './hole-card-fields';
import { LengthField } from './length-field';
import { PLACED_WORDS } from './placed';

interface PlacedLengthProps<P extends Placed> {
  readonly label: string;
  readonly value: P;
  readonly onChange: (value: P) => void;
  readonly units: Units;
  readonly error?: string | undefined;
  readonly note?: string | undefined;
  readonly way?: string | undefined;
  readonly field?: string | undefined;
  readonly placeholder?: string | undefined;
}

const WAYS = (Object.keys(PLACED_WORDS) as PlacedBy[]).map((by) => ({ value: by, label: PLACED_WORDS[by] }));

/** How far a thing lies from the first hole: one distance the way that was chosen, or two. */
export function PlacedLength<P extends Placed>(props: PlacedLengthProps<P>): ReactNode {
  const { label, value, onChange, units, field } = props;
  const shared = { units, error: props.error, note: props.note, field };
  if (value.by !== 'xy')
    return (
      <LengthField
        {...shared}
        label={label}
        way={props.way}
        placeholder={props.placeholder}
        value={value.away}
        onChange={(away) => onChange({ ...value, away })}
      />
    );
  return (
    <>
      <LengthField
        {...shared}
        label={`${label}, along`}
        value={value.x}
        onChange={(x) => onChange({ ...value, x })}
      />
      <LengthField
        units={units}
        label={`${label}, across`}
        value={value.y}
        onChange={(y) => onChange({ ...value, y })}
      />
    </>
  );
}

/** Which way it lies: along the row, square to it, or both. */
export function PlacedWay<P extends Placed>(
  props: Pick<PlacedLengthProps<P>, 'label' | 'value' | 'onChange'>,
): ReactNode {
  const { label, value, onChange } = props;
  return (
    <ChoiceField
      label={`${label}: which way`}
      value={value.by}
      choices={WAYS}
      onChange={(by) => onChange({ ...value, by })}
    />
  );
}
