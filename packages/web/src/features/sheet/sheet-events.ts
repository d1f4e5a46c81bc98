import type {
  Completion,
  Endorsement,
  Fix,
  Objection,
  Question,
  QuestionState,
  Referral,
  SheetEvent,
} from '@rivetside/shared';

/** What an event may carry beside its own thing: how the sheet stands after it. */
interface EventData {
  readonly fix?: Fix;
  readonly endorsement?: Endorsement;
  readonly objection?: Objection;
  readonly completion?: Completion;
  readonly referral?: Referral;
  readonly reason?: string;
  readonly standing?: { readonly state: QuestionState; readonly waits: Question['waits'] };
}

/** Replaces the one with the same id, or adds it at the end. */
function put<T extends { readonly id: string }>(list: readonly T[], one: T): T[] {
  return list.some(({ id }) => id === one.id)
    ? list.map((old) => (old.id === one.id ? one : old))
    : [...list, one];
}

function putInFix(fixes: readonly Fix[], fixId: string, change: (fix: Fix) => Fix): Fix[] {
  return fixes.map((fix) => (fix.id === fixId ? change(fix) : fix));
}

function changedFixes(fixes: Fix[], { fix, endorsement, objection }: EventData): Fix[] {
  let changed = fixes;
  if (fix) {
    // An event carries the fix as it was proposed or withdrawn; what stands under it arrived by other events.
    const known = changed.find(({ id }) => id === fix.id);
    changed = put(
      changed,
      known ? { ...fix, endorsements: known.endorsements, objections: known.objections } : fix,
    );
  }
  if (endorsement)
    changed = putInFix(changed, endorsement.fixId, (one) => ({
      ...one,
      endorsements: put(one.endorsements, endorsement),
    }));
  if (objection)
    changed = putInFix(changed, objection.fixId, (one) => ({
      ...one,
      objections: put(one.objections, objection),
    }));
  return changed;
}

function applyOne(sheet: Question, event: SheetEvent): Question {
  const data = event.data as EventData;
  return {
    ...sheet,
    fixes: changedFixes(sheet.fixes, data),
    referral: data.referral ?? sheet.referral,
    completion: data.completion ?? sheet.completion,
    withdrawn: event.type === 'withdrawn' ? { at: event.at, reason: data.reason ?? '' } : sheet.withdrawn,
    state: data.standing?.state ?? sheet.state,
    waits: data.standing?.waits ?? sheet.waits,
    lastActivityAt: event.at,
    lastSeq: event.seq,
    events: [...sheet.events, event],
  };
}

export interface Applied {
  readonly sheet: Question;
  /** The seq up to which everything is here, when something between is missing; else null. */
  readonly missingAfter: number | null;
}

/**
 * Applies events in the order of their numbers. One already here is passed over, so nothing is doubled; at a gap it
 * stops and says after which number to ask again, so nothing is missed.
 */
export function applySheetEvents(sheet: Question, events: readonly SheetEvent[]): Applied {
  const inOrder = [...events].sort((a, b) => a.seq - b.seq);
  let current = sheet;
  for (const event of inOrder) {
    if (event.questionId !== sheet.id || event.seq <= current.lastSeq) continue;
    if (event.seq > current.lastSeq + 1) return { sheet: current, missingAfter: current.lastSeq };
    current = applyOne(current, event);
  }
  return { sheet: current, missingAfter: null };
}

/** Puts older events in front, for "earlier talk": only those that are not here yet. */
export function withEarlierEvents(sheet: Question, earlier: readonly SheetEvent[]): Question {
  const first = sheet.events[0]?.seq ?? sheet.lastSeq + 1;
  const older = earlier.filter(({ seq }) => seq < first).sort((a, b) => a.seq - b.seq);
  return { ...sheet, events: [...older, ...sheet.events] };
}

/** Whether talk from before the oldest one here can be fetched. */
export function hasEarlierEvents(sheet: Question): boolean {
  const first = sheet.events[0]?.seq;
  return first !== undefined && first > 1;
}
