import {
  formatLength,
  rivetCallOut,
  type HoleLine,
  type Kit,
  type Section,
  type SectionSummary,
  type Units,
} from '@rivetside/shared';
import type { ReactNode } from 'react';
import { ChoiceField, TextField, TickField } from '../../components/field';
import classes from './ask.module.css';
import {
  aboutWholeBuild,
  inKit,
  atPart,
  atStep,
  fittingLines,
  inSection,
  onHoleLine,
  type AskedPlace,
} from './ask-draft';

export interface WhereCardProps {
  readonly place: AskedPlace;
  readonly onChange: (place: AskedPlace) => void;
  readonly kits: readonly Kit[];
  readonly sections: readonly SectionSummary[];
  /** The chosen section with its steps, parts and hole lines, once it is loaded. */
  readonly section: Section | undefined;
  readonly units: Units;
  /** The drawn plan, on which a section can be tapped. */
  readonly plan: ReactNode;
  readonly partFinder: ReactNode;
  readonly errors: Readonly<Record<string, string>>;
}

const NONE = { value: '', label: 'none in particular' };

function lineWords(line: HoleLine, units: Units): string {
  const pitch = line.pitch === null ? '' : ` · pitch ${formatLength(line.pitch, units)}`;
  return `${line.code} · ${line.title} · ${rivetCallOut(line.rivet)}${pitch}`;
}

function HoleFields({ place, onChange, line, errors }: WhereCardProps & { line: HoleLine }): ReactNode {
  const repeats = Array.from({ length: line.repeats }, (_, index) => ({
    value: String(index + 1),
    label: `${index + 1} of ${line.repeats}`,
  }));
  return (
    <div className={classes['three']}>
      {line.repeats > 1 && (
        <ChoiceField
          label="Which one: rib, side"
          value={String(place.repeat)}
          choices={repeats}
          onChange={(repeat) => onChange({ ...place, repeat: Number(repeat) })}
        />
      )}
      <TextField
        label="Hole numbers"
        value={place.holes}
        placeholder="7, or 3-5, 9"
        hint={`Counted from 1 to ${line.count} as drawn.`}
        field="holes"
        error={errors['holes']}
        onChange={(holes) => onChange({ ...place, holes })}
      />
    </div>
  );
}

/** The chosen line stays in the list even where step and part have moved on. */
function offeredLines(section: Section | undefined, place: AskedPlace): HoleLine[] {
  const lines = fittingLines(section, place);
  const chosen = section?.holeLines.find(({ id }) => id === place.holeLineId);
  return chosen && !lines.includes(chosen) ? [chosen, ...lines] : lines;
}

function byId<T extends { readonly id: string }>(list: readonly T[], id: string): T | null {
  return list.find((one) => one.id === id) ?? null;
}

const NOTHING: Pick<Section, 'steps' | 'parts'> = { steps: [], parts: [] };

function WithinSection(props: WhereCardProps): ReactNode {
  const { place, onChange, section, units, errors } = props;
  const { steps, parts } = section ?? NOTHING;
  const lines = offeredLines(section, place);
  const chosen = byId(lines, place.holeLineId ?? '');
  const stepChoices = steps.map(({ id, number, title }) => ({ value: id, label: `${number}, ${title}` }));
  const partChoices = parts.map(({ id, number, name }) => ({ value: id, label: `${number} ${name}` }));
  const lineChoices = lines.map((line) => ({ value: line.id, label: lineWords(line, units) }));
  const isLoading = !section;
  return (
    <>
      <div className={classes['two']}>
        <ChoiceField
          label="Step"
          value={place.stepId ?? ''}
          disabled={isLoading}
          field="stepId"
          error={errors['stepId']}
          choices={[NONE, ...stepChoices]}
          onChange={(id) => onChange(atStep(place, byId(steps, id), section))}
        />
        <ChoiceField
          label="Part"
          value={place.partId ?? ''}
          disabled={isLoading}
          field="partId"
          error={errors['partId']}
          choices={[NONE, ...partChoices]}
          onChange={(id) => onChange(atPart(place, byId(parts, id), section))}
        />
      </div>
      <ChoiceField
        label="Hole line"
        value={place.holeLineId ?? ''}
        disabled={isLoading}
        field="holeLineId"
        error={errors['holeLineId']}
        choices={[NONE, ...lineChoices]}
        onChange={(id) => onChange(onHoleLine(place, byId(lines, id)))}
      />
      {chosen && <HoleFields {...props} line={chosen} />}
    </>
  );
}

/** Where on the kit: by the plan, by section, step, part and hole line, which fill each other in, or by part number. */
export function WhereCard(props: WhereCardProps): ReactNode {
  const { place, onChange, kits, sections, plan, partFinder, errors } = props;
  return (
    <div className={classes['where']}>
      <div className={classes['plan']}>{plan}</div>
      <div className={classes['stackOfFields']}>
        {kits.length > 1 && (
          <ChoiceField
            label="Kit"
            value={place.kitId ?? ''}
            field="kitId"
            error={errors['kitId']}
            choices={kits.map(({ id, name }) => ({ value: id, label: name }))}
            onChange={(id) => onChange(inKit(place, id))}
          />
        )}
        <TickField
          label="It is about the whole build, not one section"
          isOn={place.wholeBuild}
          onChange={(isOn) => onChange(aboutWholeBuild(place, isOn))}
        />
        {!place.wholeBuild && (
          <>
            <div className={classes['two']}>
              <ChoiceField
                label="Section"
                value={place.sectionId ?? ''}
                field="sectionId"
                error={errors['sectionId']}
                choices={[
                  { value: '', label: 'choose one' },
                  ...sections.map(({ id, name }) => ({ value: id, label: name })),
                ]}
                onChange={(id) => onChange(inSection(place, id || null))}
              />
              {partFinder}
            </div>
            <WithinSection {...props} />
            <p className={classes['hint']}>
              Tap the drawing, or type a part number. Filled in when you come from a step or a hole line.
            </p>
          </>
        )}
      </div>
    </div>
  );
}
