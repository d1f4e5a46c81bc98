import { OVERSIZE_MOST, OVERSIZE_ONE_FROM, OVERSIZE_SHARE } from '../../trade/limits.js';
import { requireCount, TOLERANCE } from './require.js';

/**
 * Oversize rivets that a pattern takes: a fifth of it and at most ten (S8); one from five rivets up (house).
 * Throws RangeError naming `count`.
 */
export function oversizeAllowed(count: number): number {
  requireCount('count', count, 1);
  const share = Math.floor(count * OVERSIZE_SHARE.value + TOLERANCE);
  const least = count >= OVERSIZE_ONE_FROM.value ? 1 : 0;
  return Math.min(Math.max(share, least), OVERSIZE_MOST.value);
}
