import * as z from 'zod';

import { TEXT_LIMITS, type Range } from '../domain/limits';

export const id = z.uuid();
export const name = z.string().trim().min(1).max(TEXT_LIMITS.name);
export const isoDate = z.iso.date();
export const isoTime = z.iso.datetime({ offset: true });

/** A finite number within one of the ranges of shared/domain/limits. */
export const within = (range: Range) => z.number().min(range.min).max(range.max);

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
