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
  const subject = mail.subject.replace(/\p{Cc}+/gu, ' ');
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

/** Takes as long as a mail and sends none: where the time of an answer would tell what the answer does not. */
export async function queueNobodysMail(manager: EntityManager, at: string): Promise<void> {
  await manager.insert(OutboxEntity, {
    id: newId(),
    to: '',
    subject: '',
    text: '',
    html: '',
    createdAt: at,
    dueAt: at,
    attempts: 0,
    sentAt: at,
    lastError: null,
  });
}
