/** Nothing of ours nests deeper; a body of 5,000 brackets would overflow whoever walks it. */
export const BODY_DEPTH_MAX = 32;

/** Walks level by level, without recursion. */
export function isTooDeep(body: unknown, depth = BODY_DEPTH_MAX): boolean {
  let level: unknown[] = [body];
  for (let at = 0; at <= depth; at += 1) {
    level = level.flatMap((one) => (typeof one === 'object' && one !== null ? Object.values(one) : []));
    if (level.length === 0) return false;
  }
  return true;
}
