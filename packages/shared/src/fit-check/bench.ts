import type { HoleCard, HoleCardLimits } from './card-fields.js';
import { ORIGIN, type Point } from './geometry/enclosing-circle.js';
import { holeViews, type HoleView, type HoleViews } from './geometry/hole-views.js';
import type { RemedyKind } from './hole-card.schema.js';
import { known, said, valueOf } from './measured.js';

/** Everything the checks work from: the card, the holes worked out of it, and what they find missing or assume. */
export interface Bench {
  readonly card: HoleCard;
  readonly views: HoleViews;
  readonly limits: HoleCardLimits | null;
  readonly missing: Set<string>;
  readonly assumptions: Set<string>;
}

export function layBench(card: HoleCard): Bench {
  return {
    card,
    views: holeViews(card),
    limits: card.limits ?? null,
    missing: new Set(),
    assumptions: new Set(),
  };
}

/** What every remedy that moves the hole needs. */
export const HOLES_MISSING =
  'the hole of every layer, largest and smallest across, and how far the holes lie apart';

/** Notes what is missing, and hands it back for the line that needs it. */
export function lacking(bench: Bench, what: string): string {
  bench.missing.add(what);
  return what;
}

/** A remedy as far as the checks see it: which rivet, and where its hole would be. */
export interface Plan {
  readonly kind: RemedyKind;
  /** 1/32 inch */
  readonly dash: number;
  /** The hole as it would be made; null where none is drilled or no drill serves. */
  readonly finalHole: { readonly diameter: number; readonly drill: string } | null;
  /** How much larger than needed that hole is, inch: the room to move its centre. */
  readonly slack: number;
  /** The centre of the finished hole; null where it is not known. Where nothing is moved, each layer's own. */
  readonly centreFor: (view: HoleView, layer: number) => Point | null;
}

export const ownCentre: Plan['centreFor'] = (view, layer) => view.layers[layer] ?? null;
export const cleanedCentre: Plan['centreFor'] = (view) => view.centre;
export const drawnCentre: Plan['centreFor'] = () => ORIGIN;

/** Nominal diameter of the plan's rivet, inch. */
export function planDiameter(plan: Pick<Plan, 'dash'>): number {
  return plan.dash / 32;
}

/** The layer as the builder called it. */
export function layerName(card: HoleCard, index: number): string {
  return card.layers[index]?.name || `layer ${index + 1}`;
}

/** The rivet size as it is said: AD4, or 4/32 where the alloy is not known. */
export function rivetName(card: HoleCard, dash: number): string {
  return `${card.rivet.alloy ?? ''}${dash}`;
}

function side(x: number, y: number): string {
  if (Math.abs(x) >= Math.abs(y)) return x < 0 ? 'left' : 'right';
  return y < 0 ? 'below' : 'above';
}

/** Which neighbour is meant: "next rivet, left". */
export function neighbourName(card: HoleCard, index: number): string {
  const { x, y } = card.neighbours?.[index] ?? {};
  if (!known(x) || !known(y)) return `neighbour ${index + 1}`;
  return `next rivet, ${side(valueOf(x), valueOf(y))}`;
}

const COMPASS = [
  'right',
  'above right',
  'above',
  'above left',
  'left',
  'below left',
  'below',
  'below right',
] as const;

/** On which side something lies: "above", "left". */
export function directionName(angle: number): string {
  const eighths = Math.round((((angle % 360) + 360) % 360) / 45) % COMPASS.length;
  return COMPASS[eighths]!;
}

/** Length with sign as it stands in a formula: "+ 0.0135", "- 0.01". */
export function signed(value: number): string {
  return `${value < 0 ? '-' : '+'} ${said(Math.abs(value))}`;
}
