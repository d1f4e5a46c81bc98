import type { EntityManager } from 'typeorm';
import { newId } from '../ids.js';
import { OutboxEntity } from './outbox.entity.js';

export interface Mail {
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

/** Writes the mail into the unit of what it tells of; the worker sends it after the commit. */
export async function queueMail(manager: EntityManager, mail: Mail, at: string): Promise<string> {
  const id = newId();
  // A line break in a head field would begin another one.
  const subject = mail.subject.replace(/[\r\n]+/g, ' ');
  await manager.insert(OutboxEntity, {
    ...mail,
    subject,
    id,
    createdAt: at,
    dueAt: at,
    attempts: 0,
    sentAt: null,
    lastError: null,
  });
  return id;
}
