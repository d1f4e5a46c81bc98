import { askQuestionSchema, type HoleCard, type HolePlace } from '@rivetside/shared';
import type { AskDraft, HandedOver } from './ask-draft';
import { readHoleNumbers, type CountedLine } from './hole-numbers';

const QUESTION = askQuestionSchema.omit({ photoIds: true });

/** By field, what keeps the question from being asked. */
export type Faults = Readonly<Record<string, string>>;

export interface QuestionReading {
  /** Null while anything is missing. */
  readonly question: HandedOver | null;
  readonly errors: Faults;
}

/** What stands beside the draft: the chosen line, and what the hole card's form makes of itself. */
export interface Beside {
  readonly line: CountedLine | null;
  readonly holeCard: HoleCard | null;
  readonly holeCardErrors: Faults;
}

/** What was left out, in words of the trade; the schema knows only that something is. */
function leftOut({ place, chapterId, mishap }: AskDraft): Record<string, string> {
  const errors: Record<string, string> = {};
  if (!place.kitId) errors['kitId'] = 'The kit could not be read yet. What you typed is kept; try again.';
  if (!place.wholeBuild && !place.sectionId)
    errors['sectionId'] = 'Say in which section it is, or that it is about the whole build.';
  if (!chapterId) errors['chapterId'] = 'You ask in a chapter where you are a builder.';
  if (!mishap) errors['mishap'] = 'Choose what kind of trouble it is.';
  return errors;
}

/** The fields as the schema names them. */
function asAsked({ place, ...draft }: AskDraft, holes: readonly HolePlace[], holeCard: HoleCard | null) {
  const { kitId, sectionId, stepId, partId, holeLineId } = place;
  const { buildId, chapterId, audience, discipline, mishap, title, body } = draft;
  const where = { kitId, sectionId, stepId, partId, holeLineId, holes };
  return { ...where, buildId, chapterId, audience, discipline, mishap, title, body, holeCard };
}

type Issue = { readonly path: readonly PropertyKey[]; readonly message: string };

/** What was said of a field already is better said. */
function tell(errors: Record<string, string>, issues: readonly Issue[]): void {
  for (const { path, message } of issues) errors[path.join('.')] ??= message;
}

/** The draft as a question, without its photos, or what has to be mended before it is one. */
export function readQuestion(draft: AskDraft, { line, holeCard, holeCardErrors }: Beside): QuestionReading {
  const { place, mishap } = draft;
  const errors = leftOut(draft);
  const numbers = readHoleNumbers(line ? place.holes : '', place.repeat, line);
  if (!numbers.ok) errors['holes'] = numbers.message;
  for (const [field, message] of Object.entries(holeCardErrors)) errors[`holeCard.${field}`] = message;
  const parsed = QUESTION.safeParse(asAsked(draft, numbers.ok ? numbers.holes : [], holeCard));
  if (!parsed.success) tell(errors, parsed.error.issues);
  // Without a mishap there is no discipline yet: one fault is enough.
  if (!mishap) delete errors['discipline'];
  const isWhole = parsed.success && Object.keys(errors).length === 0;
  return { question: isWhole ? parsed.data : null, errors };
}

const ORDER = [
  'kitId',
  'sectionId',
  'stepId',
  'partId',
  'holeLineId',
  'holes',
  'buildId',
  'chapterId',
  'audience',
  'mishap',
  'discipline',
  'title',
  'body',
  'holeCard',
  'photoIds',
];

/** As they stand on the page, from top to bottom. */
export function inPageOrder(fields: readonly string[]): string[] {
  const rank = (field: string) => {
    const at = ORDER.indexOf(field.split('.')[0]!);
    return at < 0 ? ORDER.length : at;
  };
  return [...fields].sort((one, other) => rank(one) - rank(other));
}

/** The field that a dotted path of the server belongs to; `holeCardField` knows the rows of its own form. */
export function fieldOfPath(path: string, holeCardField: (path: string) => string): string {
  const [first, ...rest] = path.split('.');
  if (first === 'holeCard' && rest.length > 0) return `holeCard.${holeCardField(rest.join('.'))}`;
  if (first === 'file') return 'photoIds';
  if (first === 'holes' || first === 'photoIds') return first;
  return path;
}

/** Faults of one part of the form, by the part's own names. */
export function faultsWithin(part: string, faults: Faults): Faults {
  const start = `${part}.`;
  return Object.fromEntries(
    Object.entries(faults).flatMap(([field, message]) =>
      field.startsWith(start) ? [[field.slice(start.length), message]] : [],
    ),
  );
}
