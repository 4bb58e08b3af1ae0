import * as z from 'zod';

import { TEXT_LIMITS, type Range } from '../domain/limits';

export const id = z.uuid();
export const name = z.string().trim().min(1).max(TEXT_LIMITS.name);
/** A calendar date of our time: the ISO form alone would also take the year 0. */
export const isoDate = z.iso
  .date()
  .refine((date) => date >= '1900-01-01' && date <= '2199-12-31', 'A date from 1900 to 2199.');
const isoTime = z.iso.datetime({ offset: true });

/** A finite number within one of the ranges of shared/domain/limits. */
export const within = (range: Range) => z.number().min(range.min).max(range.max);

/** One of the tz database, such as Europe/Lisbon. */
export const timeZone = z.string().max(60).refine(isTimeZone, 'A time zone such as Europe/Lisbon.');

function isTimeZone(name: string): boolean {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: name }).format() !== '';
  } catch {
    return false;
  }
}

/** What every stored, editable thing carries; `version` counts its edits. */
export const stored = {
  id,
  version: z.int().min(1),
  createdAt: isoTime,
  updatedAt: isoTime,
};

/** The version an edit was made on; a stale one is answered with 409 and the current state. */
export const expectedVersion = z.int().min(1);

/** Keyset pages: `next` goes back as `after`, and is null on the last page. */
export const page = <T extends z.ZodType>(item: T) =>
  z.strictObject({ items: z.array(item), next: z.string().nullable() });

export const pageQuery = {
  after: z.string().max(400).optional(),
  limit: z.coerce.number().int().min(1).max(100).default(50),
};
