import type { ParsedMail } from 'mailparser';
import { MailCatcher } from '../common/mail/mail-catcher.js';
import { MailWorker } from '../common/mail/mail.worker.js';
import type { TestApp } from './start-test-app.js';

/** What has been mailed to somebody so far, newest first; what waits in the outbox is sent first. */
export async function mailsTo(test: Pick<TestApp, 'app'>, email: string): Promise<ParsedMail[]> {
  await test.app.get(MailWorker).sendDue();
  return test.app
    .get(MailCatcher)
    .caught.map(({ mail }) => mail)
    .filter(({ to }) => [to ?? []].flat().some(({ text }) => text === email));
}

/** The secret of the link in a mail. */
export function tokenIn(mail: ParsedMail | undefined): string {
  const token = /token=([\w-]+)/.exec(mail?.text ?? '')?.[1];
  if (token === undefined) throw new Error(`No link in the mail "${mail?.subject ?? 'none'}"`);
  return token;
}
