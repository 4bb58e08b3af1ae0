import { Refusal } from './refusals';

/** The last row's sort key as the client carries it back. */
const cursorOf = (...key: string[]): string =>
  Buffer.from(JSON.stringify(key)).toString('base64url');

/**
 * The sort key in a cursor.
 *
 * @param shape - what each part of the key must be
 */
export function keyOf(cursor: string, ...shape: ((part: string) => boolean)[]): string[] {
  const parts = decode(cursor);
  if (parts.length !== shape.length || !shape.every((fits, index) => fits(parts[index] ?? '')))
    throw new Refusal('invalid-query', {
      errors: [{ path: 'after', message: 'This is not the place where a page ended.' }],
    });
  return parts;
}

function decode(cursor: string): string[] {
  try {
    const parts: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString());
    return Array.isArray(parts) ? parts.map(String) : [];
  } catch {
    return [];
  }
}

/** Text as the database can hold it. */
export const isText = (part: string): boolean => part !== '' && !part.includes('\0');

/** A time as cursors carry it. */
export const isTime = (part: string): boolean =>
  !Number.isNaN(Date.parse(part)) && new Date(part).toISOString() === part;

/** A finite number as cursors carry it. */
export const isNumber = (part: string): boolean =>
  part.trim() !== '' && Number.isFinite(Number(part));

/** A date as cursors carry it; 'infinity' is that of what has none. */
export const isDate = (part: string): boolean =>
  part === 'infinity' || (/^\d{4}-\d\d-\d\d$/.test(part) && isTime(`${part}T00:00:00.000Z`));

/** Of one row more than the page holds: the page, and where the next one starts. */
export function pageOf<Row, Item>(
  rows: Row[],
  limit: number,
  { item, key }: { item: (row: Row) => Item; key: (row: Row) => string[] },
): { items: Item[]; next: string | null } {
  const kept = rows.slice(0, limit);
  const last = kept.at(-1);
  const hasMore = rows.length > limit && last !== undefined;
  return { items: kept.map(item), next: hasMore ? cursorOf(...key(last)) : null };
}

/** A pattern for ILIKE that finds the text anywhere, whatever signs it holds. */
export const containing = (text: string) => `%${text.replace(/[\\%_]/g, '\\$&')}%`;
