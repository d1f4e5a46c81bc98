import { EDGES_MAX, type Units } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { ChoiceField, TickField } from '../../components/field';
import { DirectionField, directionWords } from './direction-field';
import { blankBend, blankEdge, type BendFields, type EdgeFields, type LayerFields } from './hole-card-fields';
import classes from './hole-card.module.css';
import { LengthField } from './length-field';

/** What the fields of one layer share: where their faults and notes are kept, and whose they are. */
export interface LayerPlace {
  readonly at: string;
  readonly name: string;
  readonly units: Units;
  readonly fault: (key: string) => string | undefined;
  readonly note: (key: string) => string | undefined;
  readonly fieldName: (key: string) => string;
}

interface NearProps<F> {
  readonly place: LayerPlace;
  readonly rows: readonly F[];
  readonly isNone: boolean;
  readonly onRows: (rows: readonly F[]) => void;
}

type EdgeAt = Omit<NearProps<EdgeFields>, 'isNone'> & { readonly index: number };

const FROM = [
  { value: 'centre', label: 'its centre' },
  { value: 'rim', label: 'its rim' },
] as const;
const SIDES = [
  { value: '', label: 'not told' },
  { value: 'head', label: 'made head' },
  { value: 'shop', label: 'shop head' },
] as const;

function replaced<F>(rows: readonly F[], index: number, row: F): F[] {
  return rows.map((one, at) => (at === index ? row : one));
}

function RemoveRow({ what, onRemove }: { what: string; onRemove: () => void }): ReactNode {
  return (
    <button type="button" className={classes['remove']} onClick={onRemove} aria-label={`Remove ${what}`}>
      Remove
    </button>
  );
}

/** How far one edge is; where it lies is chosen elsewhere and said here. */
export function EdgeLength({ place, rows, index, onRows }: EdgeAt): ReactNode {
  const { at, units, fault, note, fieldName } = place;
  const key = `${at}.edges.${index}`;
  const edge = rows[index];
  if (!edge) return null;
  return (
    <LengthField
      label={edgeLabel(place, index)}
      value={edge.distance}
      units={units}
      way={directionWords(edge.angle)}
      error={fault(`${key}.distance`) ?? fault(`${key}.minimumD`)}
      note={note(`${key}.distance`)}
      field={fieldName(`${key}.distance`)}
      onChange={(distance) => onRows(replaced(rows, index, { ...edge, distance }))}
    />
  );
}

function edgeLabel({ name }: LayerPlace, index: number): string {
  return index === 0 ? `Edge, ${name}` : `Edge ${index + 1}, ${name}`;
}

/** The sides on which the edges lie; how far the first one is stands with the hole. */
export function EdgeRows({ place, rows, isNone, onRows }: NearProps<EdgeFields>): ReactNode {
  const { at, fault, fieldName } = place;
  if (isNone) return null;
  return rows.map((edge, index) => {
    const key = `${at}.edges.${index}`;
    const label = edgeLabel(place, index);
    const set = (change: Partial<EdgeFields>) => onRows(replaced(rows, index, { ...edge, ...change }));
    return (
      <div key={index} className={classes['row']}>
        {index > 0 && <EdgeLength place={place} rows={rows} index={index} onRows={onRows} />}
        <DirectionField
          label={`${label}: it lies`}
          value={edge.angle}
          error={fault(`${key}.angle`)}
          field={fieldName(`${key}.angle`)}
          onChange={(angle) => set({ angle })}
        />
        <ChoiceField
          label="Measured from"
          value={edge.from}
          choices={FROM}
          onChange={(from) => set({ from })}
        />
        {index > 0 && (
          <RemoveRow
            what={label.toLowerCase()}
            onRemove={() => onRows(rows.filter((_, other) => other !== index))}
          />
        )}
      </div>
    );
  });
}

export function BendRows({ place, rows, isNone, onRows }: NearProps<BendFields>): ReactNode {
  const { at, name, units, fault, fieldName } = place;
  return (
    <>
      {!isNone &&
        rows.map((bend, index) => {
          const key = `${at}.bends.${index}`;
          const set = (change: Partial<BendFields>) => onRows(replaced(rows, index, { ...bend, ...change }));
          return (
            <div key={index} className={classes['row']}>
              <LengthField
                label={`Bend, ${name}`}
                value={bend.distance}
                units={units}
                error={fault(`${key}.distance`)}
                field={fieldName(`${key}.distance`)}
                onChange={(distance) => set({ distance })}
              />
              <DirectionField
                label="It lies"
                value={bend.angle}
                error={fault(`${key}.angle`)}
                field={fieldName(`${key}.angle`)}
                onChange={(angle) => set({ angle })}
              />
              <ChoiceField
                label="On its side"
                value={bend.side}
                choices={SIDES}
                onChange={(side) => set({ side })}
              />
              <RemoveRow
                what={`the bend of ${name}`}
                onRemove={() => onRows(rows.filter((_, other) => other !== index))}
              />
            </div>
          );
        })}
    </>
  );
}

interface NearFootProps {
  readonly place: LayerPlace;
  readonly layer: LayerFields;
  readonly onChange: (change: Partial<LayerFields>) => void;
}

/** What else may be near, and what is not: that nobody looked is a third thing. */
export function NearFoot({ place, layer, onChange }: NearFootProps): ReactNode {
  const { name, units } = place;
  const { edges, bends, noEdge, noBend, noHole } = layer;
  return (
    <div className={classes['nearFoot']}>
      {!noEdge && edges.length < EDGES_MAX && (
        <button
          type="button"
          className={classes['add']}
          aria-label={`Add an edge of ${name}`}
          onClick={() => onChange({ edges: [...edges, blankEdge(units, '270')] })}
        >
          Add an edge
        </button>
      )}
      {!noBend && bends.length < EDGES_MAX && (
        <button
          type="button"
          className={classes['add']}
          aria-label={`Add a bend of ${name}`}
          onClick={() => onChange({ bends: [...bends, blankBend(units)] })}
        >
          Add a bend
        </button>
      )}
      <TickField label="No edge near" isOn={noEdge} onChange={(isOn) => onChange({ noEdge: isOn })} />
      <TickField label="No bend near" isOn={noBend} onChange={(isOn) => onChange({ noBend: isOn })} />
      <TickField label="Not drilled yet" isOn={noHole} onChange={(isOn) => onChange({ noHole: isOn })} />
    </div>
  );
}
