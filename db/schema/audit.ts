import { foreignKey, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';

import { happenedAt, shopId, shopPolicy } from './columns';
import { shops } from './people';

/** Only ever added to: the application has no right to change or remove an entry. */
export const auditEntries = pgTable(
  'audit_entries',
  {
    shopId: shopId(),
    id: uuid('id').notNull(),
    personId: uuid('person_id').notNull(),
    action: text('action').notNull(),
    subject: text('subject').notNull(),
    subjectId: uuid('subject_id').notNull(),
    before: jsonb('before'),
    after: jsonb('after'),
    at: happenedAt(),
  },
  (t) => [
    primaryKey({ name: 'audit_entries_pkey', columns: [t.shopId, t.id] }),
    index('audit_entries_subject').on(t.shopId, t.subject, t.subjectId, t.at),
    foreignKey({ name: 'audit_entries_shop', columns: [t.shopId], foreignColumns: [shops.id] }),
    shopPolicy('audit_entries'),
  ],
);
