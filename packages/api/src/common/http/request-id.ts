import { randomBytes } from 'node:crypto';
import type { IncomingMessage } from 'node:http';

const GIVEN = /^[\w.:-]{1,64}$/;

/** Counted within a process that has a name of its own: random numbers at every request cost more than the rest. */
const PROCESS = randomBytes(6).toString('base64url');
let counted = 0;

/** The id that a proxy gave, so that its log and ours meet; nothing that could spoil a log line is taken over. */
export function requestIdOf(raw: Pick<IncomingMessage, 'headers'>): string {
  const given = raw.headers['x-request-id'];
  return typeof given === 'string' && GIVEN.test(given) ? given : `${PROCESS}-${(counted += 1)}`;
}
