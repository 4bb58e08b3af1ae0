import type { Transaction } from '@/db/client';
import { auditEntries } from '@/db/schema';

export interface AuditEntry {
  id: string;
  personId: string;
  action: string;
  subject: string;
  subjectId: string;
  before: unknown;
  after: unknown;
}

export const auditRepository = (tx: Transaction, shopId: string) => ({
  async add(entries: readonly AuditEntry[]): Promise<void> {
    if (entries.length > 0)
      await tx.insert(auditEntries).values(entries.map((entry) => ({ shopId, ...entry })));
  },
});

export type AuditRepository = ReturnType<typeof auditRepository>;
