import type { EntityManager } from 'typeorm';
import { newId } from '../ids.js';
import { AuditTrailEntity } from './audit-trail.entity.js';

export interface AuditLine {
  readonly at: string;
  readonly byId: string | null;
  readonly what: string;
  readonly subject: readonly [type: string, id: string];
  readonly detail?: Record<string, unknown>;
}

/** Writes a line of the audit trail in the unit of what it tells of. */
export async function writeAudit(manager: EntityManager, line: AuditLine): Promise<void> {
  const [subjectType, subjectId] = line.subject;
  const { at, byId, what, detail = {} } = line;
  await manager.insert(AuditTrailEntity, {
    id: newId(),
    at,
    byId,
    what,
    subjectType,
    subjectId,
    detail: detail as object,
  });
}
