import {
  FIX_KIND_WORDS,
  FIX_KINDS,
  type FixKind,
  proposeFixSchema,
  type Question,
  type RemedyCheck,
  travellerFor,
} from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Dialog } from '../../components/dialog';
import dialogClasses from '../../components/dialog.module.css';
import { FaultSummary } from '../../components/fault-summary';
import { CheckLines } from '../../components/fit-check-lines';
import { TextField } from '../../components/field';
import { FormFoot } from '../../components/form-foot';
import { LinesField, linesOf } from '../../components/lines-field';
import { Verdict } from '../../components/verdict';
import { useDraftForm } from '../../lib/draft-form';
import { useTimes } from '../../lib/times';
import { useUnits } from '../../lib/units';
import { checkWords } from './fix-words';
import { OperationFields, type TypedOperation } from './operation-fields';
import { fixWire } from './queries';
import classes from './fixes.module.css';

interface TypedFix {
  readonly kind: FixKind | null;
  readonly summary: string;
  readonly operations: readonly TypedOperation[];
  readonly conditions: string;
}
const BLANK: TypedFix = { kind: null, summary: '', operations: [], conditions: '' };

function remedyOf({ fitCheck }: Question, kind: FixKind | null): RemedyCheck | null {
  return fitCheck?.remedies.find((remedy) => remedy.kind === kind) ?? null;
}

/** What such a fix usually is, to be changed line by line. */
function prefilled(sheet: Question, kind: FixKind): TypedFix {
  const { mishap, holeCard } = sheet;
  const usual = travellerFor({ kind, mishap, card: holeCard, remedy: remedyOf(sheet, kind) });
  const operations = usual.operations.map(({ text, caution }) => ({ text, caution: caution ?? '' }));
  return { kind, summary: usual.summary, operations, conditions: usual.conditions.join('\n') };
}

function read({ kind, summary, operations, conditions }: TypedFix): unknown {
  return {
    kind: kind ?? undefined,
    summary,
    operations: operations.map(({ text, caution }, at) => ({
      no: (at + 1) * 10,
      text,
      caution: caution.trim() || null,
    })),
    conditions: linesOf(conditions),
  };
}

/** Chosen from the check, prefilled as a traveller, and changed where this case is another. */
export function ProposeDialog({
  sheet,
  onClose,
}: {
  readonly sheet: Question;
  readonly onClose: () => void;
}): ReactNode {
  const { time } = useTimes();
  const form = useDraftForm({
    name: `fix:${sheet.id}`,
    initial: BLANK,
    schema: proposeFixSchema,
    read,
    send: (body, key) => fixWire.propose(sheet.id, body, key),
    onSent: onClose,
  });
  const { value, set } = form;
  const change = (facts: Partial<TypedFix>) => set((old) => ({ ...old, ...facts }));
  return (
    <Dialog title="Propose a fix" onClose={onClose} wide>
      <form className={dialogClasses['form']} noValidate onSubmit={(event) => void form.submit(event)}>
        <FaultSummary title="It was not sent" faults={form.faults} tries={form.tries} />
        <KindChoice sheet={sheet} chosen={value.kind} onChoose={(kind) => set(prefilled(sheet, kind))} />
        {value.kind && (
          <>
            <TextField
              label="In a line"
              field="summary"
              value={value.summary}
              error={form.errorOf('summary')}
              onChange={(summary) => change({ summary })}
            />
            <OperationFields
              operations={value.operations}
              onChange={(operations) => change({ operations })}
              errorOf={form.errorOf}
            />
            <LinesField
              label="Conditions, one a line"
              hint="The builder ticks each when it is carried out; what is left becomes an open item."
              field="conditions"
              value={value.conditions}
              error={form.errorOf('conditions')}
              onChange={(conditions) => change({ conditions })}
            />
          </>
        )}
        <FormFoot
          send="Propose it"
          isPending={form.isPending}
          onLater={onClose}
          keptAt={form.savedAt && time(form.savedAt.toISOString())}
        />
      </form>
    </Dialog>
  );
}

interface KindChoiceProps {
  readonly sheet: Question;
  readonly chosen: FixKind | null;
  readonly onChoose: (kind: FixKind) => void;
}

function KindChoice({ sheet, chosen, onChoose }: KindChoiceProps): ReactNode {
  const units = useUnits();
  const remedy = remedyOf(sheet, chosen);
  return (
    <fieldset className={dialogClasses['group']}>
      <legend>Which fix</legend>
      <div className={classes['kinds']}>
        {FIX_KINDS.map((kind) => {
          const check = remedyOf(sheet, kind);
          const { verdict, words } = checkWords(check);
          return (
            <label key={kind} className={dialogClasses['choice']}>
              <input type="radio" name="kind" checked={kind === chosen} onChange={() => onChoose(kind)} />
              <span>{FIX_KIND_WORDS[kind]}</span>
              {check && check.checks.length > 0 && <Verdict verdict={verdict}>{words}</Verdict>}
            </label>
          );
        })}
      </div>
      {remedy && remedy.checks.length > 0 && (
        <details>
          <summary>The check that is frozen beside it</summary>
          <CheckLines lines={remedy.checks} units={units} />
        </details>
      )}
      {chosen && !remedy && (
        <p className="muted">This kind has no numbers: say in the operations what is measured.</p>
      )}
    </fieldset>
  );
}
