/** Nothing of ours nests deeper; a body of 5,000 brackets would overflow whoever walks it. */
export const BODY_DEPTH_MAX = 32;

const isNest = (value: unknown): value is object => typeof value === 'object' && value !== null;

/** Walks level by level, without recursion. */
export function isTooDeep(body: unknown, depth = BODY_DEPTH_MAX): boolean {
  let level = isNest(body) ? [body] : [];
  for (let at = 0; at < depth; at += 1) {
    const below: object[] = [];
    for (const nest of level) for (const value of Object.values(nest)) if (isNest(value)) below.push(value);
    if (below.length === 0) return false;
    level = below;
  }
  return true;
}
