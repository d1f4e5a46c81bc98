import type { ReactNode } from 'react';
import { ChoiceField } from '../../components/field';
import { DirectionField } from './direction-field';
import type { LayerFields, OffsetFields } from './hole-card-fields';
import classes from './hole-card.module.css';
import { LengthField } from './length-field';
import { BendRows, EdgeLength, EdgeRows, NearFoot, type LayerPlace } from './near-fields';
import { PLACED_WORDS } from './placed';
import { PlacedLength, PlacedWay } from './placed-field';
import { PutAway } from './put-away';
import { readTyped } from './typed-length';

interface LayerFormProps {
  readonly layer: LayerFields;
  readonly place: LayerPlace;
  readonly isFirst: boolean;
  readonly drill?: string | undefined;
  readonly onChange: (layer: LayerFields) => void;
}

const OVER = [
  { value: 'centres', label: 'centre to centre' },
  { value: 'pins', label: 'over both pins' },
] as const;

const USUAL_SIDE = '90';

function isOblong({ largest, smallest, noHole }: LayerFields): boolean {
  const [one, other] = [readTyped(largest), readTyped(smallest)];
  return !noHole && one.kind === 'read' && other.kind === 'read' && one.inches !== other.inches;
}

function HoleFieldsOf({ layer, place, drill, onChange }: LayerFormProps): ReactNode {
  const { at, units, fault, fieldName } = place;
  const set = (change: Partial<LayerFields>) => onChange({ ...layer, ...change });
  return (
    <>
      <LengthField
        label="Largest across"
        value={layer.largest}
        units={units}
        isHole
        placeholder={drill}
        error={fault(`${at}.largest`)}
        field={fieldName(`${at}.largest`)}
        onChange={(largest) => set({ largest })}
      />
      <LengthField
        label="Smallest across"
        value={layer.smallest}
        units={units}
        isHole
        placeholder="round"
        error={fault(`${at}.smallest`)}
        field={fieldName(`${at}.smallest`)}
        onChange={(smallest) => set({ smallest })}
      />
      {isOblong(layer) && (
        <DirectionField
          label="Its long way lies"
          value={layer.holeAngle}
          error={fault(`${at}.holeAngle`)}
          field={fieldName(`${at}.holeAngle`)}
          onChange={(holeAngle) => set({ holeAngle })}
        />
      )}
    </>
  );
}

/** Only with pins may the reading be over them. */
function isReadByPins({ by, away }: OffsetFields): boolean {
  return by !== 'xy' && away.tool === 'pins' && away.typed.trim() !== '';
}

function OffsetLength({ layer, place, onChange }: LayerFormProps): ReactNode {
  const { at, units, fault, note, fieldName } = place;
  const key = `${at}.offset`;
  return (
    <PlacedLength
      label="Layers off by"
      value={layer.offset}
      units={units}
      way={PLACED_WORDS[layer.offset.by]}
      error={fault(key)}
      note={note(key)}
      field={fieldName(key)}
      onChange={(offset) => onChange({ ...layer, offset })}
    />
  );
}

function OffsetWay({ layer, onChange }: LayerFormProps): ReactNode {
  const set = (offset: OffsetFields) => onChange({ ...layer, offset });
  return (
    <div className={classes['row']}>
      <PlacedWay label="Layers off by" value={layer.offset} onChange={set} />
      {isReadByPins(layer.offset) && (
        <ChoiceField
          label="Read"
          value={layer.offset.over}
          choices={OVER}
          onChange={(over) => set({ ...layer.offset, over })}
        />
      )}
    </div>
  );
}

/** Whether anything that is put away differs from what is usual, or is wrong. */
function isDetailed({ layer, place }: LayerFormProps): boolean {
  const { edges, bends, noEdge, noBend, noHole, offset } = layer;
  return (
    [noEdge, noBend, noHole, offset.by !== 'above', offset.over !== 'centres'].some(Boolean) ||
    edges.length > 1 ||
    bends.length > 0 ||
    edges.some(({ from, angle }) => from !== 'centre' || angle !== USUAL_SIDE) ||
    place.fault(`${place.at}.edges.0.angle`) !== undefined
  );
}

/** What was measured in one layer: what nearly every card has in sight, the rest put away. */
export function LayerForm(props: LayerFormProps): ReactNode {
  const { layer, place, isFirst, onChange } = props;
  const { edges, bends, noEdge, noBend, noHole } = layer;
  const set = (change: Partial<LayerFields>) => onChange({ ...layer, ...change });
  const setEdges = (rows: LayerFields['edges']) => set({ edges: rows });
  return (
    <fieldset className={classes['layer']}>
      <legend>{place.name}</legend>
      <div className={classes['row']}>
        {!noHole && <HoleFieldsOf {...props} />}
        {!noHole && !isFirst && <OffsetLength {...props} />}
        {!noEdge && <EdgeLength place={place} rows={edges} index={0} onRows={setEdges} />}
      </div>
      <PutAway title={`More of ${place.name}: which way, rim or centre, bends`} isNeeded={isDetailed(props)}>
        {!noHole && !isFirst && <OffsetWay {...props} />}
        <EdgeRows place={place} rows={edges} isNone={noEdge} onRows={setEdges} />
        <BendRows place={place} rows={bends} isNone={noBend} onRows={(rows) => set({ bends: rows })} />
        <NearFoot place={place} layer={layer} onChange={set} />
      </PutAway>
    </fieldset>
  );
}
