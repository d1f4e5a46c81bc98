import type { ReactNode } from 'react';
import { ChoiceField } from '../../components/field';
import { DirectionField } from './direction-field';
import type { LayerFields, OffsetFields } from './hole-card-fields';
import classes from './hole-card.module.css';
import { LengthField } from './length-field';
import { BendRows, EdgeRows, NearFoot, type LayerPlace } from './near-fields';
import { PlacedField } from './placed-field';
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

function OffsetFieldsOf({ layer, place, onChange }: LayerFormProps): ReactNode {
  const { at, units, fault, note, fieldName } = place;
  const key = `${at}.offset`;
  const set = (offset: OffsetFields) => onChange({ ...layer, offset });
  return (
    <>
      <PlacedField
        label="Layers off by"
        value={layer.offset}
        units={units}
        error={fault(key)}
        note={note(key)}
        field={fieldName(key)}
        onChange={set}
      />
      {isReadByPins(layer.offset) && (
        <ChoiceField
          label="Read"
          value={layer.offset.over}
          choices={OVER}
          onChange={(over) => set({ ...layer.offset, over })}
        />
      )}
    </>
  );
}

/** Only with pins may the reading be over them. */
function isReadByPins({ by, away }: OffsetFields): boolean {
  return by !== 'xy' && away.tool === 'pins' && away.typed.trim() !== '';
}

/** What was measured in one layer. */
export function LayerForm(props: LayerFormProps): ReactNode {
  const { layer, place, isFirst, onChange } = props;
  const set = (change: Partial<LayerFields>) => onChange({ ...layer, ...change });
  return (
    <fieldset className={classes['layer']}>
      <legend>{place.name}</legend>
      {!layer.noHole && (
        <div className={classes['row']}>
          <HoleFieldsOf {...props} />
          {!isFirst && <OffsetFieldsOf {...props} />}
        </div>
      )}
      <EdgeRows place={place} rows={layer.edges} isNone={layer.noEdge} onRows={(edges) => set({ edges })} />
      <BendRows place={place} rows={layer.bends} isNone={layer.noBend} onRows={(bends) => set({ bends })} />
      <NearFoot place={place} layer={layer} onChange={set} />
    </fieldset>
  );
}
