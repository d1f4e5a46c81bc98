import {
  type Basis,
  BASIS_WORDS,
  BASES,
  endorseSchema,
  type Fix,
  type Me,
  type Question,
} from '@rivetside/shared';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Dialog } from '../../components/dialog';
import dialogClasses from '../../components/dialog.module.css';
import { FaultSummary } from '../../components/fault-summary';
import { TextField, TickField } from '../../components/field';
import { FormFoot } from '../../components/form-foot';
import { LinesField, linesOf } from '../../components/lines-field';
import { Stamp } from '../../components/stamp';
import { useDraftForm } from '../../lib/draft-form';
import { useTimes } from '../../lib/times';
import { lastGoodDay } from './last-good-day';
import { chapterMembers, stampWire } from './queries';
import { readHoles, readSerials } from './scope-words';
import classes from './endorsements.module.css';

interface TypedStamp {
  readonly basis: Basis;
  readonly reference: string;
  readonly serials: string;
  readonly holes: string;
  readonly wholeLine: boolean;
  readonly conditions: string;
  readonly goodUntil: string;
  readonly reason: string;
}

interface EndorseDialogProps {
  readonly sheet: Question;
  readonly fix: Fix;
  readonly me: Me;
  /** A line of the frozen check is outside: then a reason is asked for. */
  readonly isOutside: boolean;
  readonly onClose: () => void;
}

const isCritical = ({ section }: Question) => section?.critical ?? false;

function blank(sheet: Question): TypedStamp {
  return {
    // Where the section is critical a stamp on experience does not count: nothing is chosen that would be refused.
    basis: isCritical(sheet) ? 'drawingNote' : 'experience',
    reference: '',
    serials: '',
    holes: '',
    wholeLine: false,
    conditions: '',
    goodUntil: '',
    reason: '',
  };
}

function read(typed: TypedStamp, sheet: Question): unknown {
  const { basis, reference, conditions, goodUntil, reason } = typed;
  const serials = readSerials(typed.serials);
  const holes = readHoles(typed.holes);
  const scope = {
    ...(serials.length > 0 ? { serials } : {}),
    ...(holes.length > 0 ? { holes } : {}),
    ...(typed.wholeLine && sheet.holeLine ? { holeLineIds: [sheet.holeLine.id] } : {}),
  };
  return {
    basis,
    ...(reference.trim() ? { reference: reference.trim() } : {}),
    ...(Object.keys(scope).length > 0 ? { scope } : {}),
    conditions: linesOf(conditions),
    ...(goodUntil ? { goodUntil } : {}),
    ...(reason.trim() ? { reason: reason.trim() } : {}),
  };
}

/** Gives a stamp, drawn as it will stand before it is given. */
export function EndorseDialog({ sheet, fix, me, isOutside, onClose }: EndorseDialogProps): ReactNode {
  const form = useDraftForm({
    name: `stamp:${fix.id}`,
    initial: blank(sheet),
    schema: endorseSchema,
    read: (typed) => read(typed, sheet),
    send: (body, key) => stampWire.endorse(fix.id, body, key),
    onSent: onClose,
  });
  const { value, set } = form;
  const change = (facts: Partial<TypedStamp>) => set((old) => ({ ...old, ...facts }));
  return (
    <Dialog title="Endorse this fix" onClose={onClose} wide>
      <form className={dialogClasses['form']} noValidate onSubmit={(event) => void form.submit(event)}>
        <FaultSummary title="It was not given" faults={form.faults} tries={form.tries} />
        <p>
          <b>{fix.summary}</b>. A stamp says that you have looked and would do it so. It is advice among
          builders: it stands under your name, can be withdrawn with a reason, and is never edited.
        </p>
        {isCritical(sheet) && (
          <p className={dialogClasses['note']}>
            This section is critical: two stamps are needed, and none of them counts on experience.
          </p>
        )}
        <div className={classes['twoColumns']}>
          <BasisChoice
            value={value.basis}
            isCritical={isCritical(sheet)}
            error={form.errorOf('basis')}
            onChoose={(basis) => change({ basis })}
          />
          <Preview sheet={sheet} me={me} basis={value.basis} />
        </div>
        {value.basis !== 'experience' && (
          <TextField
            label="Reference"
            hint="the drawing and note, the page, the reply: so that others can look"
            field="reference"
            value={value.reference}
            error={form.errorOf('reference')}
            onChange={(reference) => change({ reference })}
          />
        )}
        <ScopeFields typed={value} sheet={sheet} onChange={change} errorOf={form.errorOf} />
        <LinesField
          label="Conditions, one a line"
          hint="ticked by the builder when it is carried out"
          field="conditions"
          value={value.conditions}
          error={form.errorOf('conditions')}
          onChange={(conditions) => change({ conditions })}
        />
        <GoodUntil
          typed={value}
          fix={fix}
          error={form.errorOf('goodUntil')}
          onChange={(goodUntil) => change({ goodUntil })}
        />
        {isOutside && (
          <LinesField
            label="Why, although a line of the check is outside"
            hint="shown with your stamp for ever"
            field="reason"
            value={value.reason}
            error={form.errorOf('reason')}
            onChange={(reason) => change({ reason })}
          />
        )}
        <FormFoot send="Give the stamp" isPending={form.isPending} onLater={onClose} />
      </form>
    </Dialog>
  );
}

interface BasisChoiceProps {
  readonly value: Basis;
  readonly isCritical: boolean;
  readonly error: string | undefined;
  readonly onChoose: (basis: Basis) => void;
}

function BasisChoice({ value, isCritical: critical, error, onChoose }: BasisChoiceProps): ReactNode {
  return (
    <fieldset className={dialogClasses['group']}>
      <legend>What it rests on</legend>
      {BASES.map((basis) => (
        <label key={basis} className={dialogClasses['choice']}>
          <input
            type="radio"
            name="basis"
            data-field="basis"
            disabled={critical && basis === 'experience'}
            checked={basis === value}
            onChange={() => onChoose(basis)}
          />
          <span>{BASIS_WORDS[basis]}</span>
        </label>
      ))}
      {error && <p role="alert">{error}</p>}
    </fieldset>
  );
}

function Preview({
  sheet,
  me,
  basis,
}: {
  readonly sheet: Question;
  readonly me: Me;
  readonly basis: Basis;
}): ReactNode {
  const { date } = useTimes();
  const chapter = me.memberships.find(({ roles, status }) => status === 'active' && roles.includes('mentor'));
  const { data } = useQuery({ ...chapterMembers(chapter?.chapterId ?? ''), enabled: chapter !== undefined });
  const stampNumber = data?.items.find(({ userId }) => userId === me.id)?.stampNumber ?? 'M-';
  const stamp = { stampNumber, discipline: sheet.discipline, basis, state: 'live' as const };
  return (
    <div className={classes['preview']}>
      <Stamp stamp={stamp} day={date(new Date().toISOString())} who={me.name} preview />
      <p className="muted">as it will stand</p>
    </div>
  );
}

interface ScopeFieldsProps {
  readonly typed: TypedStamp;
  readonly sheet: Question;
  readonly onChange: (facts: Partial<TypedStamp>) => void;
  readonly errorOf: (field: string) => string | undefined;
}

function ScopeFields({ typed, sheet, onChange, errorOf }: ScopeFieldsProps): ReactNode {
  const first = (name: string) => errorOf(`scope.${name}`) ?? errorOf(`scope.${name}.0`);
  return (
    <fieldset className={dialogClasses['group']}>
      <legend>What it speaks for; nothing named means this case only</legend>
      <div className={dialogClasses['row']}>
        <TextField
          label="Serials"
          hint="such as 101-140, 158"
          field="scope.serials"
          value={typed.serials}
          error={first('serials')}
          onChange={(serials) => onChange({ serials })}
        />
        <TextField
          label="Hole numbers"
          hint="such as 7, 8"
          field="scope.holes"
          value={typed.holes}
          error={first('holes')}
          onChange={(holes) => onChange({ holes })}
        />
      </div>
      {sheet.holeLine && (
        <TickField
          label={`Hole line ${sheet.holeLine.code}`}
          isOn={typed.wholeLine}
          onChange={(wholeLine) => onChange({ wholeLine })}
        />
      )}
    </fieldset>
  );
}

interface GoodUntilProps {
  readonly typed: TypedStamp;
  readonly fix: Fix;
  readonly error: string | undefined;
  readonly onChange: (day: string) => void;
}

function GoodUntil({ typed, fix, error, onChange }: GoodUntilProps): ReactNode {
  const { date } = useTimes();
  const last = lastGoodDay(typed.basis, fix.kind);
  return (
    <TextField
      label="Good until"
      type="date"
      max={last}
      hint={`left empty: ${date(last)}, the longest on this basis`}
      field="goodUntil"
      value={typed.goodUntil}
      error={error}
      onChange={onChange}
    />
  );
}
