import { asDoneCheck, completeSchema, type Fix, type Question } from '@rivetside/shared';
import { type ReactNode, useCallback, useMemo } from 'react';
import { Dialog } from '../../components/dialog';
import dialogClasses from '../../components/dialog.module.css';
import { FaultSummary } from '../../components/fault-summary';
import { TextField, TickField } from '../../components/field';
import { CheckLines } from '../../components/fit-check-lines';
import { FormFoot } from '../../components/form-foot';
import { LinesField } from '../../components/lines-field';
import { Verdict } from '../../components/verdict';
import { useDraftForm } from '../../lib/draft-form';
import { useTimes } from '../../lib/times';
import { useUnits } from '../../lib/units';
import { type AttachedPhoto, BLANK_DONE, readDone, type TypedDone } from './as-done-fields';
import { conditionsOf } from './fix-words';
import { MeasuredFields } from './measured-fields';
import { fixWire } from './queries';

type Update = (photos: readonly AttachedPhoto[]) => readonly AttachedPhoto[];
export type DonePhotoSlot = (props: {
  readonly photos: readonly AttachedPhoto[];
  readonly onChange: (update: Update) => void;
}) => ReactNode;

interface CarryOutDialogProps {
  readonly sheet: Question;
  readonly fix: Fix;
  readonly onClose: () => void;
  readonly photoSlot: DonePhotoSlot;
}

/** What was really done, measured and checked again before it goes into the record. */
export function CarryOutDialog({ sheet, fix, onClose, photoSlot }: CarryOutDialogProps): ReactNode {
  const units = useUnits();
  const { time } = useTimes();
  const form = useDraftForm({
    name: `done:${fix.id}`,
    initial: BLANK_DONE,
    schema: completeSchema,
    read: (typed) => readDone(typed, fix.id, units),
    send: (body, key) => fixWire.carryOut(sheet.id, body, key),
    onSent: onClose,
  });
  const { value, set } = form;
  const change = (facts: Partial<TypedDone>) => set((old) => ({ ...old, ...facts }));
  const changePhotos = useCallback(
    (update: Update) => set((old) => ({ ...old, photos: update(old.photos) })),
    [set],
  );
  return (
    <Dialog title="Carry it out" onClose={onClose} wide>
      <form className={dialogClasses['form']} noValidate onSubmit={(event) => void form.submit(event)}>
        <FaultSummary title="It was not sent" faults={form.faults} tries={form.tries} />
        <p>
          <b>{fix.summary}</b>
        </p>
        <Conditions
          fix={fix}
          met={value.conditionsMet}
          onChange={(conditionsMet) => change({ conditionsMet })}
        />
        <MeasuredFields sheet={sheet} typed={value} onChange={change} errorOf={form.errorOf} />
        <CheckedAgain sheet={sheet} fix={fix} typed={value} />
        <div className={dialogClasses['row']}>
          <TextField
            label="Minutes"
            inputMode="numeric"
            field="minutes"
            value={value.minutes}
            error={form.errorOf('minutes')}
            onChange={(minutes) => change({ minutes })}
          />
          <TextField
            label="Helpers"
            hint="names, with commas between"
            field="helpers"
            value={value.helpers}
            error={form.errorOf('helpers')}
            onChange={(helpers) => change({ helpers })}
          />
        </div>
        <LinesField
          label="Note"
          field="note"
          value={value.note}
          error={form.errorOf('note')}
          onChange={(note) => change({ note })}
        />
        {photoSlot({ photos: value.photos, onChange: changePhotos })}
        <p className="muted">
          It goes into the record of your build as it stands, and is never changed there.
        </p>
        <FormFoot
          send="Carried out"
          isPending={form.isPending}
          onLater={onClose}
          keptAt={form.savedAt && time(form.savedAt.toISOString())}
        />
      </form>
    </Dialog>
  );
}

interface ConditionsProps {
  readonly fix: Fix;
  readonly met: readonly string[];
  readonly onChange: (met: readonly string[]) => void;
}

function Conditions({ fix, met, onChange }: ConditionsProps): ReactNode {
  const conditions = conditionsOf(fix);
  if (conditions.length === 0) return null;
  const left = conditions.filter((condition) => !met.includes(condition)).length;
  return (
    <fieldset className={dialogClasses['group']}>
      <legend>Conditions</legend>
      {conditions.map((condition) => (
        <TickField
          key={condition}
          label={condition}
          isOn={met.includes(condition)}
          onChange={(isOn) => onChange(isOn ? [...met, condition] : met.filter((one) => one !== condition))}
        />
      ))}
      {left > 0 && (
        <p className="muted">What is not ticked becomes an open item of your build: {left} so far.</p>
      )}
    </fieldset>
  );
}

/** With the limits that the fix was checked by. */
function CheckedAgain({
  sheet,
  fix,
  typed,
}: {
  readonly sheet: Question;
  readonly fix: Fix;
  readonly typed: TypedDone;
}): ReactNode {
  const units = useUnits();
  const card = fix.holeCard ?? sheet.holeCard;
  const check = useMemo(() => {
    const read = completeSchema.shape.asDone.safeParse(
      (readDone(typed, fix.id, units) as { asDone: unknown }).asDone,
    );
    return card && read.success ? asDoneCheck(card, read.data, fix.check) : null;
  }, [typed, fix, units, card]);
  if (!check) return null;
  return (
    <details>
      <summary>
        Checked again: <Verdict verdict={check.verdict} />
      </summary>
      <CheckLines lines={check.checks} units={units} />
    </details>
  );
}
