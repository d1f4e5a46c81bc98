import { LAYERS_MAX, STRENGTH_ALLOYS, type FINISHES, type Units } from '@rivetside/shared';
import { useId, type ReactNode } from 'react';
import { ChoiceField, TextField } from '../../components/field';
import { blankLayer, type LayerFields } from './hole-card-fields';
import classes from './hole-card.module.css';
import { LengthField } from './length-field';

interface StackFieldsProps {
  readonly layers: readonly LayerFields[];
  readonly onChange: (layers: readonly LayerFields[]) => void;
  readonly units: Units;
  readonly fault: (key: string) => string | undefined;
  readonly fieldName: (key: string) => string;
}

const FINISH_CHOICES: readonly { value: '' | (typeof FINISHES)[number]; label: string }[] = [
  { value: '', label: 'not told' },
  { value: 'bare', label: 'bare' },
  { value: 'primed', label: 'primed' },
  { value: 'dimpled', label: 'dimpled' },
  { value: 'countersunk', label: 'countersunk' },
];

/** The sheets that the rivet goes through, in order from the first; known alloys are offered, any other is taken. */
export function StackFields({ layers, onChange, units, fault, fieldName }: StackFieldsProps): ReactNode {
  const alloys = useId();
  const set = (index: number, change: Partial<LayerFields>) =>
    onChange(layers.map((layer, at) => (at === index ? { ...layer, ...change } : layer)));
  return (
    <div className={classes['stack']}>
      <datalist id={alloys}>
        {STRENGTH_ALLOYS.map((alloy) => (
          <option key={alloy} value={alloy} />
        ))}
      </datalist>
      <ol>
        {layers.map((layer, index) => (
          <li key={index}>
            <b className={classes['number']}>{index + 1}</b>
            <TextField
              label={
                layer.partNumber ? (
                  <>
                    Layer <span className={classes['call']}>{layer.partNumber}</span>
                  </>
                ) : (
                  'Layer'
                )
              }
              value={layer.name}
              placeholder="rear spar"
              field={fieldName(`layers.${index}.name`)}
              error={fault(`layers.${index}.name`)}
              onChange={(name) => set(index, { name })}
            />
            <TextField
              label="Alloy"
              list={alloys}
              value={layer.alloy}
              placeholder="2024-T3 clad"
              field={fieldName(`layers.${index}.alloy`)}
              error={fault(`layers.${index}.alloy`)}
              onChange={(alloy) => set(index, { alloy })}
            />
            <LengthField
              label="Thickness"
              value={layer.thickness}
              units={units}
              withTool={false}
              field={fieldName(`layers.${index}.thickness`)}
              error={fault(`layers.${index}.thickness`)}
              onChange={(thickness) => set(index, { thickness })}
            />
            <ChoiceField
              label="Finish"
              value={layer.finish}
              choices={FINISH_CHOICES}
              onChange={(finish) => set(index, { finish })}
            />
            {layers.length > 1 && (
              <button
                type="button"
                className={classes['remove']}
                aria-label={`Remove layer ${index + 1}`}
                onClick={() => onChange(layers.filter((_, at) => at !== index))}
              >
                Remove
              </button>
            )}
          </li>
        ))}
      </ol>
      {layers.length < LAYERS_MAX && (
        <button
          type="button"
          className={classes['add']}
          onClick={() => onChange([...layers, blankLayer(units)])}
        >
          Add a layer
        </button>
      )}
    </div>
  );
}
