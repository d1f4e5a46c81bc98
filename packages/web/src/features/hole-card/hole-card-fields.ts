import type { FINISHES, HoleCard, HoleCardLimits, Units } from '@rivetside/shared';
import type { Tool } from './measuring-tools';

/** A length as it was typed; a bare number keeps the unit that was usual when it was typed. */
export interface TypedLength {
  readonly typed: string;
  readonly units: Units;
  readonly tool: Tool;
}

/** Degrees as typed, counter-clockwise from along the row; empty where the side was not told. */
export type TypedAngle = string;

/** Along or across the row by one distance, or by two. */
export type PlacedBy = 'right' | 'above' | 'left' | 'below' | 'xy';

export interface Placed {
  readonly by: PlacedBy;
  readonly away: TypedLength;
  readonly x: TypedLength;
  readonly y: TypedLength;
}

export interface OffsetFields extends Placed {
  /** Over pins in both holes, the reading is larger by half of each hole. */
  readonly over: 'centres' | 'pins';
}

export interface NeighbourFields extends Placed {
  readonly from: 'centre' | 'rim';
  /** Thirty-seconds; empty where it is the rivet as drawn. */
  readonly dash: string;
  readonly head: 'universal' | 'flush' | null;
}

export interface EdgeFields {
  readonly distance: TypedLength;
  readonly from: 'centre' | 'rim';
  readonly angle: TypedAngle;
  readonly minimumD: number | null;
}

export interface BendFields {
  readonly distance: TypedLength;
  readonly angle: TypedAngle;
  readonly side: '' | 'head' | 'shop';
}

export interface LayerFields {
  readonly name: string;
  readonly partId: string | null;
  /** Part number, for the eye alone. */
  readonly partNumber: string | null;
  readonly alloy: string;
  readonly thickness: TypedLength;
  /** Nothing is drilled in this layer yet. */
  readonly noHole: boolean;
  readonly largest: TypedLength;
  readonly smallest: TypedLength;
  readonly holeAngle: TypedAngle;
  readonly offset: OffsetFields;
  readonly edges: readonly EdgeFields[];
  readonly noEdge: boolean;
  readonly bends: readonly BendFields[];
  readonly noBend: boolean;
  readonly finish: '' | (typeof FINISHES)[number];
}

export const FLAGS = [
  'critical',
  'controlSurface',
  'fuelWet',
  'pressurised',
  'crack',
  'hingeOrEngineMount',
] as const;
export type Flag = (typeof FLAGS)[number];
export const FLAG_WORDS: Readonly<Record<Flag, string>> = {
  critical: 'Critical structure: spar, horn, control, attach fitting',
  controlSurface: 'A control surface',
  fuelWet: 'Wet with fuel',
  pressurised: 'Pressurised',
  crack: 'There is a crack',
  hingeOrEngineMount: 'A hinge or the engine mount',
};

/** Flags told: what is not marked is then not so. Untold, only what the kit says of the place stands. */
export type FlagFields = Readonly<Record<Flag, boolean>> & { readonly told: boolean };

/** The hole card as it stands in the form: everything kept as typed. */
export interface HoleCardFields {
  readonly layers: readonly LayerFields[];
  readonly rivet: string;
  readonly neighbours: readonly NeighbourFields[];
  readonly noNeighbour: boolean;
  readonly count: string;
  readonly oversize: string;
  readonly adjacent: string;
  readonly flags: FlagFields;
  readonly access: '' | NonNullable<HoleCard['access']>;
  readonly headWidth: TypedLength;
  readonly headHeight: TypedLength;
  readonly drawn: HoleCard['drawn'];
  readonly limits: HoleCardLimits | null;
}

export function blankLength(units: Units, tool: Tool): TypedLength {
  return { typed: '', units, tool };
}

function blankPlaced(units: Units, tool: Tool, by: PlacedBy): Placed {
  return {
    by,
    away: blankLength(units, tool),
    x: blankLength(units, tool),
    y: blankLength(units, tool),
  };
}

export function blankEdge(units: Units, angle: TypedAngle = '90'): EdgeFields {
  return { distance: blankLength(units, 'caliper'), from: 'centre', angle, minimumD: null };
}

export function blankBend(units: Units): BendFields {
  return { distance: blankLength(units, 'caliper'), angle: '270', side: '' };
}

export function blankNeighbour(units: Units, by: PlacedBy): NeighbourFields {
  return { ...blankPlaced(units, 'caliper', by), from: 'centre', dash: '', head: null };
}

export function blankOffset(units: Units): OffsetFields {
  return { ...blankPlaced(units, 'pins', 'above'), over: 'centres' };
}

export function blankLayer(units: Units): LayerFields {
  return {
    name: '',
    partId: null,
    partNumber: null,
    alloy: '',
    thickness: blankLength(units, 'none'),
    noHole: false,
    largest: blankLength(units, 'pins'),
    smallest: blankLength(units, 'pins'),
    holeAngle: '',
    offset: blankOffset(units),
    edges: [blankEdge(units)],
    noEdge: false,
    bends: [],
    noBend: false,
    finish: '',
  };
}

const NOTHING_TOLD: FlagFields = {
  told: false,
  critical: false,
  controlSurface: false,
  fuelWet: false,
  pressurised: false,
  crack: false,
  hingeOrEngineMount: false,
};

/** A hole card of which nothing is known: two layers, a rivet on either side. */
export function blankHoleCard(units: Units): HoleCardFields {
  return {
    layers: [blankLayer(units), blankLayer(units)],
    rivet: '',
    neighbours: [blankNeighbour(units, 'left'), blankNeighbour(units, 'right')],
    noNeighbour: false,
    count: '',
    oversize: '',
    adjacent: '',
    flags: NOTHING_TOLD,
    access: '',
    headWidth: blankLength(units, 'caliper'),
    headHeight: blankLength(units, 'caliper'),
    drawn: null,
    limits: null,
  };
}

/** What the kit says of the place stands until the builder tells; being told is what the boxes do. */
export function flagsOfPlace(critical: boolean): FlagFields {
  return { ...NOTHING_TOLD, critical };
}
