const FIRST_WAIT_MS = 15_000;
const LONGEST_WAIT_MS = 3_600_000;
const FIRST_REST_MS = 1_000;
const LONGEST_REST_MS = 60_000;
/** As long as other mail servers try. */
const GIVE_UP_MS = 5 * 86_400_000;

/** Due at no time: it stays in the outbox, with why, for a person to look at. */
export const NEVER = '9999-12-31T00:00:00.000Z';

/** What nodemailer says of a server that was not to be had, and what the network says itself. */
const SERVER_FAULT =
  /^(ECONN\w*|ETIMEDOUT|ESOCKET|EDNS|ETLS|EREQUIRETLS|EPROTOCOL|EPROXY|E?NOAUTH|EAUTH|EOAUTH2|ENOTFOUND|EAI_AGAIN|EHOSTUNREACH|ENETUNREACH|EPIPE)$/;
/** About to close: said in answer to whatever was said last. */
const CLOSING = 421;

/** The server was not to be had, or would not talk to us at all: that says nothing about the mail. */
export function isServerFault(error: unknown): boolean {
  const { code, responseCode } = (error ?? {}) as { code?: unknown; responseCode?: unknown };
  return responseCode === CLOSING || (typeof code === 'string' && SERVER_FAULT.test(code));
}

/** How long the server is left alone after so many faults in a row. */
export function restMs(faults: number): number {
  return Math.min(FIRST_REST_MS * 2 ** (faults - 1), LONGEST_REST_MS);
}

/** When a mail that was itself refused is tried again. */
export function nextTry(mail: { readonly attempts: number; readonly createdAt: string }, now: Date): string {
  if (now.getTime() - Date.parse(mail.createdAt) >= GIVE_UP_MS) return NEVER;
  const wait = Math.min(FIRST_WAIT_MS * 2 ** mail.attempts, LONGEST_WAIT_MS);
  return later(now, wait);
}

export function later(now: Date, ms: number): string {
  return new Date(now.getTime() + ms).toISOString();
}
