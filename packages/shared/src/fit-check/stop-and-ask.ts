import { STRENGTH_ALLOYS } from '../trade/sheets.js';
import type { HoleCard } from './card-fields.js';
import type { RemedyCheck, StopCode, Verdict } from './hole-card.schema.js';

type Flags = NonNullable<HoleCard['flags']>;

const BY_FLAG: readonly (readonly [keyof Flags, StopCode])[] = [
  ['critical', 'critical_section'],
  ['crack', 'crack'],
  ['fuelWet', 'fuel_wet'],
  ['pressurised', 'pressurised'],
  ['hingeOrEngineMount', 'hinge_or_engine_mount'],
  ['controlSurface', 'mass_balance'],
];

const WORKABLE: readonly Verdict[] = ['inside', 'marginal'];

function byFlags(card: HoleCard): StopCode[] {
  return BY_FLAG.filter(([flag]) => card.flags?.[flag]).map(([, code]) => code);
}

/** An edge that is short as found counts always; one that the next size would make short, only where that size is needed. */
function byEdges(remedies: readonly RemedyCheck[]): StopCode[] {
  const of = (kind: RemedyCheck['kind']) => remedies.find((remedy) => remedy.kind === kind);
  const needsNext = ![of('leave'), of('cleanUp')].some(
    (remedy) => remedy && WORKABLE.includes(remedy.verdict),
  );
  const looked = [of('leave'), needsNext ? of('nextSize') : undefined];
  const codes = looked
    .flatMap((remedy) => remedy?.checks ?? [])
    .filter(({ id, verdict }) => /^(edge|corner):/.test(id) && verdict === 'outside')
    .map(({ code }) => code);
  const floor: StopCode[] = codes.includes('below_floor') ? ['below_floor'] : [];
  return codes.length > 0 ? [...floor, 'edge_below_minimum'] : [];
}

function byNextSize(remedies: readonly RemedyCheck[]): StopCode[] {
  const checks = remedies.find(({ kind }) => kind === 'nextSize')?.checks ?? [];
  const codes: StopCode[] = [];
  if (checks.some(({ code }) => code === 'skips_size')) codes.push('skips_size');
  if (checks.some(({ id, verdict }) => id === 'pattern' && verdict === 'outside'))
    codes.push('pattern_limit');
  return codes;
}

function byAlloy(card: HoleCard): StopCode[] {
  const named = card.layers.some(({ alloy }) => alloy && !STRENGTH_ALLOYS.includes(alloy));
  return named ? ['unknown_alloy'] : [];
}

/** Reasons to stop and ask the kit maker, or a licensed engineer or mechanic, before anything is drilled. */
export function stopAndAsk(card: HoleCard, remedies: readonly RemedyCheck[]): StopCode[] {
  return [...byFlags(card), ...byNextSize(remedies), ...byEdges(remedies), ...byAlloy(card)];
}
