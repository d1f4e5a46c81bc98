import {
  LAYERS_MAX,
  type HoleCardLimits,
  type HoleLine,
  type KitLimits,
  type Units,
} from '@rivetside/shared';
import { blankHoleCard, blankLayer, flagsOfPlace, type HoleCardFields } from './hole-card-fields';
import { rivetTyped } from './rivet-words';
import { typedFrom } from './typed-length';

function limitsFrom(limits: KitLimits | null): HoleCardLimits | null {
  return limits && { ...limits };
}

/**
 * What the drawing already tells of a hole line: stack, rivet, count, the kit maker's limits. Nothing measured: what
 * nobody measured stays blank.
 */
export function fieldsOfHoleLine(
  line: HoleLine,
  place: { readonly critical: boolean },
  units: Units,
): HoleCardFields {
  const layers = line.stack.slice(0, LAYERS_MAX).map((part) => ({
    ...blankLayer(units),
    name: part.name,
    partId: part.partId,
    partNumber: part.number,
    alloy: part.alloy,
    thickness: typedFrom(part.thickness, units, 'none'),
  }));
  const blank = blankHoleCard(units);
  return {
    ...blank,
    layers: layers.length > 0 ? layers : blank.layers,
    rivet: rivetTyped(line.rivet),
    count: String(line.count),
    flags: flagsOfPlace(place.critical),
    drawn: { pitch: line.pitch, edge: line.edge },
    limits: limitsFrom(line.limits),
  };
}
