import * as z from 'zod';

/** The stable words by which a client tells refusals apart. */
export const PROBLEM_CODES = [
  'invalid-json',
  'invalid-body',
  'invalid-query',
  'unauthenticated',
  'forbidden',
  'not-found',
  'method-not-allowed',
  'stale-version',
  'id-reused',
  'name-taken',
  'too-large',
  'unsupported-media-type',
  'refused-by-rule',
  'too-many-requests',
  'cross-site',
  'internal',
  'unavailable',
] as const;

export type ProblemCode = (typeof PROBLEM_CODES)[number];

/** RFC 9457 problem details. `current` is the state as it stands, where an edit was made on an older one. */
export const problemDetails = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string().optional(),
  code: z.enum(PROBLEM_CODES),
  requestId: z.string().optional(),
  errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  current: z.unknown().optional(),
  /** Which rule refused, where several could: stable, for a client to act on. */
  rule: z.string().optional(),
});

export type ProblemDetails = z.infer<typeof problemDetails>;
