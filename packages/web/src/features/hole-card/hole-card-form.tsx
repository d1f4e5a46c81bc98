import { formatLength, formatLengthUnit, known, type HoleCardLimits, type Units } from '@rivetside/shared';
import { useId, type ReactNode } from 'react';
import { TextField } from '../../components/field';
import type { HoleCardFields, LayerFields } from './hole-card-fields';
import classes from './hole-card.module.css';
import { LayerForm } from './layer-fields';
import type { LayerPlace } from './near-fields';
import { NeighbourRows } from './neighbour-fields';
import { AccessField, FlagFieldset, PatternFieldset, ShopHeadFieldset } from './place-fields';
import { PutAway } from './put-away';
import type { HoleCardReading } from './read-hole-card';
import { readRivet, rivetUnderstood } from './rivet-words';
import { StackFields } from './stack-fields';

export interface HoleCardFormProps {
  readonly value: HoleCardFields;
  readonly onChange: (value: HoleCardFields) => void;
  readonly units: Units;
  /** What `readHoleCard(value, units)` makes of it. */
  readonly reading: HoleCardReading;
  /** Faults by field beside those of the reading, as the server told them. */
  readonly errors?: Readonly<Record<string, string>> | undefined;
  /** Before every field's name, so that a summary finds it: `holeCard` makes `holeCard.layers.0.largest`. */
  readonly name?: string;
  /** The drill as drawn, shown where nothing was measured yet. */
  readonly drill?: string | undefined;
  /** The trouble is a rivet already set: its head is asked for first. */
  readonly isRivetSet?: boolean;
}

const RIVETS = ['470 AD3', '470 AD4', '470 AD5', '470 AD6', '426 AD3', '426 AD4', '426 AD5'];

function rivetHint(typed: string, units: Units): string {
  const reading = readRivet(typed);
  if (!reading.ok) return '';
  return rivetUnderstood(reading.rivet, formatLengthUnit(reading.rivet.dash / 32, units));
}

function limitWords(limits: HoleCardLimits, units: Units): string {
  const words = [
    known(limits.edgeMinimumD) && `edge at least ${limits.edgeMinimumD} D`,
    known(limits.pitchMinimumD) && `pitch at least ${limits.pitchMinimumD} D`,
    known(limits.holeMaximum) && `hole at most ${formatLength(limits.holeMaximum, units)}`,
  ].filter(Boolean);
  return `${words.join(', ')} (${limits.source})`;
}

const PUT_AWAY = [
  'group.count',
  'group.oversize',
  'group.adjacentOversize',
  'shopHead.width',
  'shopHead.height',
];

/** The count alone comes with the hole line: it is no reason to show the rest. */
function isPatternTold({ oversize, adjacent, headWidth, headHeight }: HoleCardFields): boolean {
  return [oversize, adjacent, headWidth.typed, headHeight.typed].some((typed) => typed.trim() !== '');
}

function layerTitle({ name }: LayerFields, index: number): string {
  return name.trim() || `layer ${index + 1}`;
}

function PatternPart(props: Parameters<typeof PatternFieldset>[0] & { isRivetSet: boolean }): ReactNode {
  const { value, fault, isRivetSet } = props;
  return (
    <PutAway
      title={isRivetSet ? 'The pattern' : 'The pattern, and a rivet that is already set'}
      isNeeded={isPatternTold(value) || PUT_AWAY.some((key) => fault(key) !== undefined)}
    >
      <PatternFieldset {...props} />
      {!isRivetSet && <ShopHeadFieldset {...props} />}
    </PutAway>
  );
}

/** What was measured about a hole. Everything may stay blank; what is blank counts as not known. */
export function HoleCardForm(props: HoleCardFormProps): ReactNode {
  const { value, onChange, units, reading, errors, name = 'holeCard', drill, isRivetSet = false } = props;
  const rivets = useId();
  const fault = (key: string) => reading.errors[key] ?? errors?.[key];
  const note = (key: string) => reading.notes[key];
  const fieldName = (key: string) => `${name}.${key}`;
  const change = (part: Partial<HoleCardFields>) => onChange({ ...value, ...part });
  const part = { value, onChange: change, units, fault, note, fieldName };
  const placeOf = (layer: LayerFields, index: number): LayerPlace => ({
    at: `layers.${index}`,
    name: layerTitle(layer, index),
    units,
    fault,
    note,
    fieldName,
  });
  return (
    <div className={classes['form']}>
      <datalist id={rivets}>
        {RIVETS.map((rivet) => (
          <option key={rivet} value={rivet} />
        ))}
      </datalist>
      <StackFields
        layers={value.layers}
        units={units}
        fault={fault}
        fieldName={fieldName}
        onChange={(layers) => change({ layers })}
      />
      <div className={classes['row']}>
        <TextField
          label="Rivet as drawn"
          list={rivets}
          value={value.rivet}
          placeholder="470 AD4"
          hint={rivetHint(value.rivet, units) || undefined}
          error={value.rivet.trim() || errors?.['rivet'] ? fault('rivet') : undefined}
          field={fieldName('rivet')}
          onChange={(rivet) => change({ rivet })}
        />
        <AccessField {...part} />
      </div>
      {value.limits && (
        <p className={classes['limits']}>
          The kit maker’s own limits stand here: {limitWords(value.limits, units)}.
        </p>
      )}
      {isRivetSet && <ShopHeadFieldset {...part} />}
      {value.layers.map((layer, index) => (
        <LayerForm
          key={index}
          layer={layer}
          place={placeOf(layer, index)}
          isFirst={index === 0}
          drill={drill}
          onChange={(next) => change({ layers: value.layers.map((one, at) => (at === index ? next : one)) })}
        />
      ))}
      <NeighbourRows {...part} />
      <FlagFieldset {...part} />
      <PatternPart {...part} isRivetSet={isRivetSet} />
    </div>
  );
}
