import type { IncomingMessage } from 'node:http';
import { newId } from '../ids.js';

const GIVEN = /^[\w.:-]{1,64}$/;

/** The id that a proxy gave, so that its log and ours meet; nothing that could spoil a log line is taken over. */
export function requestIdOf(raw: Pick<IncomingMessage, 'headers'>): string {
  const given = raw.headers['x-request-id'];
  return typeof given === 'string' && GIVEN.test(given) ? given : newId();
}
