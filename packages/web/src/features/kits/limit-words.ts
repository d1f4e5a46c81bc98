import { formatLength, type KitLimits, type Units } from '@rivetside/shared';

/** "edge at least 2.0 D, hole at most 0.161": what the kit maker holds a hole line to, by whatever is given. */
export function limitWords(limits: KitLimits, units: Units): string {
  const { edgeMinimumD, pitchMinimumD, holeMaximum, shopHeadMinimumWidthD, shopHeadMinimumHeightD } = limits;
  const atLeast = (what: string, ratio: number | null) =>
    ratio === null ? null : `${what} at least ${ratio} D`;
  return [
    atLeast('edge', edgeMinimumD),
    atLeast('pitch', pitchMinimumD),
    holeMaximum === null ? null : `hole at most ${formatLength(holeMaximum, units)}`,
    atLeast('shop head width', shopHeadMinimumWidthD),
    atLeast('shop head height', shopHeadMinimumHeightD),
  ]
    .filter((words) => words !== null)
    .join(', ');
}
