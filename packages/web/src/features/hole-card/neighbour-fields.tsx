import { formatLength, known, NEIGHBOURS_MAX, valueOf, type Units } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { ChoiceField, TextField, TickField } from '../../components/field';
import { blankNeighbour, type HoleCardFields, type NeighbourFields } from './hole-card-fields';
import classes from './hole-card.module.css';
import { PlacedField } from './placed-field';

interface NeighbourRowsProps {
  readonly value: HoleCardFields;
  readonly onChange: (change: Partial<HoleCardFields>) => void;
  readonly units: Units;
  readonly fault: (key: string) => string | undefined;
  readonly note: (key: string) => string | undefined;
  readonly fieldName: (key: string) => string;
}

const FROM = [
  { value: 'centre', label: 'centre to centre' },
  { value: 'rim', label: 'rim to rim' },
] as const;
const SIDE_WORDS = {
  left: 'left',
  right: 'right',
  above: 'above',
  below: 'below',
  xy: 'off the row',
} as const;

/** The rivets and holes next to it, nearest first. */
export function NeighbourRows({
  value,
  onChange,
  units,
  fault,
  note,
  fieldName,
}: NeighbourRowsProps): ReactNode {
  const { neighbours, noNeighbour, drawn } = value;
  const pitch = known(drawn?.pitch) ? formatLength(valueOf(drawn.pitch), units) : undefined;
  const set = (index: number, row: NeighbourFields) =>
    onChange({ neighbours: neighbours.map((one, at) => (at === index ? row : one)) });
  return (
    <fieldset className={classes['layer']}>
      <legend>Next holes</legend>
      {!noNeighbour &&
        neighbours.map((neighbour, index) => {
          const key = `neighbours.${index}`;
          const label = `Next hole, ${SIDE_WORDS[neighbour.by]}`;
          return (
            <div key={index} className={classes['row']}>
              <PlacedField
                label={label}
                value={neighbour}
                units={units}
                placeholder={pitch && `drawn ${pitch}`}
                error={fault(key)}
                note={note(key)}
                field={fieldName(key)}
                onChange={(row) => set(index, row)}
              />
              <ChoiceField
                label="Measured"
                value={neighbour.from}
                choices={FROM}
                onChange={(from) => set(index, { ...neighbour, from })}
              />
              <TextField
                label="Its rivet size"
                value={neighbour.dash}
                placeholder="as this one"
                error={fault(`${key}.dash`)}
                field={fieldName(`${key}.dash`)}
                onChange={(dash) => set(index, { ...neighbour, dash })}
              />
              {index > 1 && (
                <button
                  type="button"
                  className={classes['remove']}
                  aria-label={`Remove ${label.toLowerCase()}`}
                  onClick={() => onChange({ neighbours: neighbours.filter((_, at) => at !== index) })}
                >
                  Remove
                </button>
              )}
            </div>
          );
        })}
      <div className={classes['nearFoot']}>
        {!noNeighbour && neighbours.length < NEIGHBOURS_MAX && (
          <button
            type="button"
            className={classes['add']}
            onClick={() => onChange({ neighbours: [...neighbours, blankNeighbour(units, 'xy')] })}
          >
            Add a hole
          </button>
        )}
        <TickField
          label="No other hole is near"
          isOn={noNeighbour}
          onChange={(isOn) => onChange({ noNeighbour: isOn })}
        />
      </div>
    </fieldset>
  );
}
