import { formatLength, known, NEIGHBOURS_MAX, valueOf, type Units } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { ChoiceField, TextField, TickField } from '../../components/field';
import { blankNeighbour, type HoleCardFields, type NeighbourFields } from './hole-card-fields';
import classes from './hole-card.module.css';
import { PlacedLength, PlacedWay } from './placed-field';
import { PutAway } from './put-away';

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

function labelOf({ by }: NeighbourFields, index: number): string {
  return index < 2 ? `Next hole, ${SIDE_WORDS[by]}` : `Hole ${index + 1}, ${SIDE_WORDS[by]}`;
}

function isUsual({ by, from, dash }: NeighbourFields, index: number): boolean {
  return from === 'centre' && dash === '' && by === (['left', 'right'] as const)[index];
}

interface OneNeighbour {
  readonly label: string;
  readonly neighbour: NeighbourFields;
  readonly error: string | undefined;
  readonly field: string;
  readonly onChange: (neighbour: NeighbourFields) => void;
  readonly onRemove: (() => void) | null;
}

/** Which way it lies, how it was measured, and what goes through it. */
function NeighbourRow({ label, neighbour, error, field, onChange, onRemove }: OneNeighbour): ReactNode {
  return (
    <div className={classes['row']}>
      <PlacedWay label={label} value={neighbour} onChange={onChange} />
      <ChoiceField
        label="Measured"
        value={neighbour.from}
        choices={FROM}
        onChange={(from) => onChange({ ...neighbour, from })}
      />
      <TextField
        label="Its rivet size"
        value={neighbour.dash}
        placeholder="as this one"
        error={error}
        field={field}
        onChange={(dash) => onChange({ ...neighbour, dash })}
      />
      {onRemove && (
        <button
          type="button"
          className={classes['remove']}
          aria-label={`Remove ${label.toLowerCase()}`}
          onClick={onRemove}
        >
          Remove
        </button>
      )}
    </div>
  );
}

/** The rivets and holes next to it, nearest first. */
export function NeighbourRows(props: NeighbourRowsProps): ReactNode {
  const { value, onChange, units, fault, note, fieldName } = props;
  const { neighbours, noNeighbour, drawn } = value;
  const pitch = known(drawn?.pitch) ? formatLength(valueOf(drawn.pitch), units) : undefined;
  const set = (index: number, row: NeighbourFields) =>
    onChange({ neighbours: neighbours.map((one, at) => (at === index ? row : one)) });
  const isDetailed =
    noNeighbour ||
    neighbours.some((one, index) => !isUsual(one, index) || fault(`neighbours.${index}.dash`) !== undefined);
  return (
    <fieldset className={classes['layer']}>
      <legend>Next holes</legend>
      {!noNeighbour && (
        <div className={classes['row']}>
          {neighbours.map((neighbour, index) => (
            <PlacedLength
              key={index}
              label={labelOf(neighbour, index)}
              value={neighbour}
              units={units}
              placeholder={pitch && `drawn ${pitch}`}
              error={fault(`neighbours.${index}`)}
              note={note(`neighbours.${index}`)}
              field={fieldName(`neighbours.${index}`)}
              onChange={(row) => set(index, row)}
            />
          ))}
        </div>
      )}
      <PutAway title="More of the next holes: which way, rim to rim, other rivets" isNeeded={isDetailed}>
        {!noNeighbour &&
          neighbours.map((neighbour, index) => (
            <NeighbourRow
              key={index}
              label={labelOf(neighbour, index)}
              neighbour={neighbour}
              error={fault(`neighbours.${index}.dash`)}
              field={fieldName(`neighbours.${index}.dash`)}
              onChange={(row) => set(index, row)}
              onRemove={
                index > 1 ? () => onChange({ neighbours: neighbours.filter((_, at) => at !== index) }) : null
              }
            />
          ))}
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
      </PutAway>
    </fieldset>
  );
}
