import { formatLengthUnit, type Question, readLength, type Units } from '@rivetside/shared';
import type { ReactNode } from 'react';
import dialogClasses from '../../components/dialog.module.css';
import { TextField } from '../../components/field';
import { useUnits } from '../../lib/units';
import type { TypedDone, TypedReading } from './as-done-fields';

interface MeasuredFieldsProps {
  readonly sheet: Question;
  readonly typed: TypedDone;
  readonly onChange: (facts: Partial<TypedDone>) => void;
  readonly errorOf: (field: string) => string | undefined;
}

/** What was understood of a length, beside its field. */
function understood(typed: string, units: Units): string | undefined {
  if (typed.trim() === '') return undefined;
  const reading = readLength(typed, units);
  return reading.ok ? formatLengthUnit(reading.inches, units) : reading.message;
}

/** Final drill, edges, driven head, rivet and whatever else was read off. */
export function MeasuredFields({ sheet, typed, onChange, errorOf }: MeasuredFieldsProps): ReactNode {
  const units = useUnits();
  const layers = sheet.holeCard?.layers ?? [];
  const length = (label: string, field: string, value: string, set: (value: string) => void) => (
    <TextField
      key={field}
      label={label}
      field={field}
      value={value}
      hint={understood(value, units)}
      error={errorOf(field)}
      onChange={set}
    />
  );
  const setEdge = (at: number, value: string) =>
    onChange({ edges: layers.map((_, index) => (index === at ? value : (typed.edges[index] ?? ''))) });
  return (
    <fieldset className={dialogClasses['group']}>
      <legend>As done</legend>
      <div className={dialogClasses['row']}>
        <TextField
          label="Final drill"
          hint="such as #21"
          field="asDone.finalDrill"
          value={typed.finalDrill}
          error={errorOf('asDone.finalDrill')}
          onChange={(finalDrill) => onChange({ finalDrill })}
        />
        {layers.map(({ name }, at) =>
          length(
            `Edge, ${name ?? `layer ${at + 1}`}`,
            `asDone.edgeDistances.${at}`,
            typed.edges[at] ?? '',
            (value) => setEdge(at, value),
          ),
        )}
        {length('Shop head, width', 'asDone.shopHead.width', typed.headWidth, (headWidth) =>
          onChange({ headWidth }),
        )}
        {length('Shop head, height', 'asDone.shopHead.height', typed.headHeight, (headHeight) =>
          onChange({ headHeight }),
        )}
        <TextField
          label="Rivet length"
          hint="in 1/16 in, such as 5.5"
          field="asDone.rivetLengthDash"
          value={typed.rivetLength}
          error={errorOf('asDone.rivetLengthDash')}
          onChange={(rivetLength) => onChange({ rivetLength })}
        />
      </div>
      <Readings readings={typed.readings} onChange={(readings) => onChange({ readings })} errorOf={errorOf} />
    </fieldset>
  );
}

interface ReadingsProps {
  readonly readings: readonly TypedReading[];
  readonly onChange: (readings: readonly TypedReading[]) => void;
  readonly errorOf: (field: string) => string | undefined;
}

function Readings({ readings, onChange, errorOf }: ReadingsProps): ReactNode {
  const set = (at: number, facts: Partial<TypedReading>) =>
    onChange(readings.map((one, index) => (index === at ? { ...one, ...facts } : one)));
  return (
    <>
      {readings.map((reading, at) => (
        <div key={at} className={dialogClasses['row']}>
          {(['what', 'value', 'unit'] as const).map((name) => (
            <TextField
              key={name}
              label={{ what: 'What was read', value: 'Reading', unit: 'Unit' }[name]}
              field={`asDone.readings.${at}.${name}`}
              value={reading[name]}
              error={errorOf(`asDone.readings.${at}.${name}`)}
              onChange={(value) => set(at, { [name]: value })}
            />
          ))}
        </div>
      ))}
      <div>
        <button
          type="button"
          className="btn plain"
          onClick={() => onChange([...readings, { what: '', value: '', unit: 'in' }])}
        >
          Another reading
        </button>
      </div>
    </>
  );
}
