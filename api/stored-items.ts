import { createHash } from 'node:crypto';

import type { AuditedWrite, AuditTrail } from './audit/audit-trail';
import { idReused, notFound, staleVersion } from './refusals';

/**
 * Held until the transaction ends. 'share' keeps a row as it is, 'no key update' is taken to edit it: others may
 * still refer to it.
 */
export type Lock = 'share' | 'no key update';

export interface Item {
  id: string;
  version: number;
}

/** What every repository of editable things offers. */
export interface ItemRepository<T extends Item, Create extends { id: string }, Content> {
  find(id: string, lock?: Lock): Promise<T | null>;
  /** The digest of the request that made it. */
  creationDigest(id: string): Promise<string | null>;
  /** Null when the id is in use. */
  insert(request: Create, digest: string): Promise<T | null>;
  update(id: string, content: Content): Promise<T>;
}

interface Trail<T> {
  subject: AuditedWrite['subject'];
  audit: AuditTrail;
  /** What of the item is written down; all of it where left out. */
  view?: (item: T) => unknown;
}

export interface Creation<T> {
  /** False when the same request came before: nothing was done. */
  isNew: boolean;
  item: T;
}

/** The fields that every stored thing carries, as contracts have them. */
export const storedFields = (row: Item & { createdAt: Date; updatedAt: Date }) => ({
  id: row.id,
  version: row.version,
  createdAt: row.createdAt.toISOString(),
  updatedAt: row.updatedAt.toISOString(),
});

export async function existing<T>(found: Promise<T | null>): Promise<T> {
  const item = await found;
  if (item === null) throw notFound();
  return item;
}

/** Stores a new thing once, however often its request comes; another request with its id is refused. */
export async function createItem<T extends Item, Create extends { id: string }>(
  repository: Pick<ItemRepository<T, Create, never>, 'insert' | 'creationDigest' | 'find'>,
  request: Create,
  { subject, audit, view = (item) => item }: Trail<T>,
): Promise<Creation<T>> {
  const digest = digestOf(request);
  const item = await repository.insert(request, digest);
  if (item) {
    await audit.record({
      action: 'create',
      subject,
      subjectId: item.id,
      before: null,
      after: view(item),
    });
    return { isNew: true, item };
  }
  if ((await repository.creationDigest(request.id)) !== digest) throw idReused();
  return { isNew: false, item: await existing(repository.find(request.id)) };
}

interface Edit<T, Content> {
  id: string;
  request: Content & { version: number };
  /** Throws where the person may not make this change. */
  check?: (before: T) => void;
}

/** Stores an edit made on the newest version; one made on an older version is refused. */
export async function updateItem<T extends Item, Content>(
  repository: Pick<ItemRepository<T, never, Content>, 'find' | 'update'>,
  { id, request, check }: Edit<T, Content>,
  { subject, audit, view = (item) => item }: Trail<T>,
): Promise<T> {
  const before = await existing(repository.find(id, 'no key update'));
  check?.(before);
  if (before.version !== request.version) throw staleVersion(before);
  const after = await repository.update(id, request);
  await audit.record({
    action: 'update',
    subject,
    subjectId: id,
    before: view(before),
    after: view(after),
  });
  return after;
}

/** The same for two requests that say the same, in whatever order of their keys. */
export function digestOf(request: unknown): string {
  return createHash('sha256').update(JSON.stringify(request, sortedKeys)).digest('hex');
}

function sortedKeys(_key: string, value: unknown): unknown {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return value;
  return Object.fromEntries(Object.entries(value).sort(([a], [b]) => (a < b ? -1 : 1)));
}
