import type { ACCESSES, Units } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { ChoiceField, TextField, TickField } from '../../components/field';
import { FLAG_WORDS, FLAGS, type Flag, type FlagFields, type HoleCardFields } from './hole-card-fields';
import classes from './hole-card.module.css';
import { LengthField } from './length-field';

interface PartProps {
  readonly value: HoleCardFields;
  readonly onChange: (change: Partial<HoleCardFields>) => void;
  readonly units: Units;
  readonly fault: (key: string) => string | undefined;
  readonly fieldName: (key: string) => string;
}

const ACCESS_CHOICES: readonly { value: '' | (typeof ACCESSES)[number]; label: string }[] = [
  { value: '', label: 'not told' },
  { value: 'both', label: 'both sides' },
  { value: 'squeezer', label: 'a squeezer only' },
  { value: 'oneSide', label: 'one side only' },
];

export function AccessField({ value, onChange }: Pick<PartProps, 'value' | 'onChange'>): ReactNode {
  return (
    <ChoiceField
      label="It can be reached from"
      value={value.access}
      choices={ACCESS_CHOICES}
      onChange={(access) => onChange({ access })}
    />
  );
}

/** What kind of place it is. Ticking any of it, or none of these, tells all of it. */
export function FlagFieldset({ value, onChange }: Pick<PartProps, 'value' | 'onChange'>): ReactNode {
  const { flags } = value;
  const isNone = flags.told && !FLAGS.some((flag) => flags[flag]);
  const set = (flag: Flag, isOn: boolean) => onChange({ flags: { ...flags, [flag]: isOn, told: true } });
  function handleNone(isOn: boolean) {
    const none = Object.fromEntries(FLAGS.map((flag) => [flag, false])) as Omit<FlagFields, 'told'>;
    onChange({ flags: { ...none, told: isOn } });
  }
  return (
    <fieldset className={classes['layer']}>
      <legend>What kind of place</legend>
      <div className={classes['ticks']}>
        {FLAGS.map((flag) => (
          <TickField
            key={flag}
            label={FLAG_WORDS[flag]}
            isOn={flags[flag]}
            onChange={(isOn) => set(flag, isOn)}
          />
        ))}
        <TickField label="None of these" isOn={isNone} onChange={handleNone} />
      </div>
    </fieldset>
  );
}

export function PatternFieldset({ value, onChange, fault, fieldName }: PartProps): ReactNode {
  const counts = [
    ['count', 'Rivets in the pattern', value.count],
    ['oversize', 'Oversize already', value.oversize],
    ['adjacent', 'Of them side by side', value.adjacent],
  ] as const;
  const keys = {
    count: 'group.count',
    oversize: 'group.oversize',
    adjacent: 'group.adjacentOversize',
  } as const;
  return (
    <fieldset className={classes['layer']}>
      <legend>The pattern</legend>
      <div className={classes['row']}>
        {counts.map(([name, label, typed]) => (
          <TextField
            key={name}
            label={label}
            inputMode="numeric"
            value={typed}
            error={fault(keys[name])}
            field={fieldName(keys[name])}
            onChange={(text) => onChange({ [name]: text })}
          />
        ))}
      </div>
    </fieldset>
  );
}

export function ShopHeadFieldset({ value, onChange, units, fault, fieldName }: PartProps): ReactNode {
  return (
    <fieldset className={classes['layer']}>
      <legend>The shop head, where a rivet is set</legend>
      <div className={classes['row']}>
        <LengthField
          label="Shop head, width"
          value={value.headWidth}
          units={units}
          error={fault('shopHead.width')}
          field={fieldName('shopHead.width')}
          onChange={(headWidth) => onChange({ headWidth })}
        />
        <LengthField
          label="Shop head, height"
          value={value.headHeight}
          units={units}
          error={fault('shopHead.height')}
          field={fieldName('shopHead.height')}
          onChange={(headHeight) => onChange({ headHeight })}
        />
      </div>
    </fieldset>
  );
}
