import { useState } from 'react';
import type { Fault } from '../../components/fault-summary';
import { Problem, sentenceOf } from '../../lib/problem';
import type { AskDraft } from './ask-draft';
import { fieldOfPath, inPageOrder, type Faults } from './read-question';

/** What the server would not take, and of which draft: a fault stands until its field is another. */
interface Refusal {
  readonly draft: AskDraft;
  readonly errors: Faults;
}

const NO_FIELD: ReadonlySet<string> = new Set(['kitId', '']);

function within(value: unknown, path: readonly string[]): unknown {
  return path.reduce<unknown>(
    (part, key) => (part as Record<string, unknown> | null | undefined)?.[key],
    value,
  );
}

function typedAt(draft: AskDraft, field: string): string {
  const [first = '', ...rest] = field.split('.');
  if (first in draft.place) return JSON.stringify(within(draft.place, [first]) ?? null);
  if (rest.length === 0) return JSON.stringify(within(draft, [first]) ?? null);
  return JSON.stringify(within(draft.holeCard, rest) ?? draft.holeCard);
}

/** The faults of a refusal that are still there in what is typed now. */
export function standingFaults(refusal: Refusal, draft: AskDraft): Record<string, string> {
  const entries = Object.entries(refusal.errors);
  return Object.fromEntries(
    entries.filter(([field]) => typedAt(draft, field) === typedAt(refusal.draft, field)),
  );
}

function linesOf(errors: Faults): Fault[] {
  return inPageOrder(Object.keys(errors)).map((field) => ({
    field: NO_FIELD.has(field) ? '' : field,
    message: errors[field]!,
  }));
}

/** What keeps the question from being asked: found here before it was sent, or told by the server after. */
export function useFaults() {
  const [tries, setTries] = useState(0);
  const [lines, setLines] = useState<readonly Fault[]>([]);
  const [refusal, setRefusal] = useState<Refusal | null>(null);
  const told = (next: readonly Fault[], refused: Refusal | null) => {
    setLines(next);
    setRefusal(refused);
    setTries((before) => before + 1);
  };
  return {
    tries,
    clear: () => {
      setLines([]);
      setRefusal(null);
    },
    refuse: (errors: Faults) => told(linesOf(errors), null),
    refused: (error: unknown, draft: AskDraft, holeCardField: (path: string) => string) => {
      const faults = error instanceof Problem ? error.errors : [];
      const errors = Object.fromEntries(
        faults.map(({ path, message }) => [fieldOfPath(path, holeCardField), message]),
      );
      const general = faults.length === 0 ? [{ field: '', message: sentenceOf(error) }] : [];
      told([...general, ...linesOf(errors)], { draft, errors });
      return { errors };
    },
    /** Faults by field as things stand; before the first try, none. */
    standing: (draft: AskDraft, now: Faults): Faults =>
      tries === 0 ? {} : { ...(refusal ? standingFaults(refusal, draft) : {}), ...now },
    /** Lines of the summary whose fault still stands. */
    summary: (standing: Faults) => lines.filter(({ field }) => field === '' || standing[field] !== undefined),
  };
}
