import type { TryLimit } from '../../common/limits/tries.js';

const QUARTER_HOUR = 15 * 60_000;
const HOUR = 60 * 60_000;

/**
 * How guessing and flooding are held off. Only wrong passwords count, and a right one forgives them; a browser that
 * has signed in to the account before is counted by itself, so that no stranger's tries, however many and from
 * wherever, keep its owner out.
 */
export const WRONG_BY_DEVICE: TryLimit = { name: 'wrong-by-device', most: 10, withinMs: QUARTER_HOUR };
export const WRONG_BY_STRANGER: TryLimit = { name: 'wrong-by-stranger', most: 10, withinMs: QUARTER_HOUR };
/** All strangers together, from whatever addresses. */
export const WRONG_FOR_ACCOUNT: TryLimit = { name: 'wrong-for-account', most: 100, withinMs: QUARTER_HOUR };
/** One address at all accounts together. */
export const WRONG_FROM_ADDRESS: TryLimit = { name: 'wrong-from-address', most: 300, withinMs: QUARTER_HOUR };
/** Whoever found a session open knows no password yet. */
export const WRONG_BY_OWNER: TryLimit = { name: 'wrong-by-owner', most: 10, withinMs: QUARTER_HOUR };

export const SIGN_UPS: TryLimit = { name: 'sign-up', most: 100, withinMs: QUARTER_HOUR };
export const RESETS: TryLimit = { name: 'reset', most: 5, withinMs: QUARTER_HOUR };
export const RESETS_FROM_ADDRESS: TryLimit = { name: 'reset-from', most: 50, withinMs: QUARTER_HOUR };
export const DEAD_LINKS: TryLimit = { name: 'dead-link', most: 60, withinMs: QUARTER_HOUR };
/** Of one kind to one mailbox; further ones are not sent, and nobody is told: that would tell of an account. */
export const MAILS_TO_ONE: TryLimit = { name: 'mail-to', most: 10, withinMs: HOUR };
