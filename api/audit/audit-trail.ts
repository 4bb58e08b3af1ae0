import { v7 as uuidv7 } from 'uuid';

import type { AuditEntry, AuditRepository } from './audit-repository';

/** What was done to what. `before` is null for what is new. */
export type AuditedWrite = Pick<AuditEntry, 'subjectId' | 'before' | 'after'> & {
  action: 'create' | 'update' | 'recompute' | 'retire' | 'record' | 'end';
  subject: 'shop' | 'membership' | 'lathe' | 'grinder' | 'wheel' | 'setup' | 'appointment';
};

/** Writes down who did what, in the transaction in which they do it. */
export const auditTrail = (repository: AuditRepository, personId: string) => ({
  record: (...writes: AuditedWrite[]): Promise<void> =>
    repository.add(writes.map((write) => ({ id: uuidv7(), personId, ...write }))),
});

export type AuditTrail = ReturnType<typeof auditTrail>;
