import type { ProblemCode, ProblemDetails } from '@/shared/contracts/problem';

type FieldErrors = NonNullable<ProblemDetails['errors']>;

interface RefusalDetails {
  detail?: string;
  errors?: FieldErrors;
  current?: unknown;
  rule?: string;
  retryAfterSeconds?: number;
}

/** An answer other than the one asked for. The error handler turns it into problem details. */
export class Refusal extends Error {
  constructor(
    readonly code: ProblemCode,
    readonly details: RefusalDetails = {},
  ) {
    super(details.detail ?? code);
    this.name = 'Refusal';
  }
}

/** Also for what belongs to another shop: its existence is not told. */
export const notFound = () => new Refusal('not-found');

export const staleVersion = (current: unknown) =>
  new Refusal('stale-version', {
    detail: 'It was changed in the meantime. Compare with the version as it stands now.',
    current,
  });

export const idReused = () =>
  new Refusal('id-reused', { detail: 'This id belongs to something else already.' });

export const taken = (path: string, message: string) =>
  new Refusal('name-taken', { errors: [{ path, message }] });

export const refusedByRule = (path: string, message: string) =>
  new Refusal('refused-by-rule', { errors: [{ path, message }] });

export const invalidField = (path: string, message: string) =>
  new Refusal('invalid-body', { errors: [{ path, message }] });

export function demand(allowed: boolean): void {
  if (!allowed)
    throw new Refusal('forbidden', { detail: 'Your role in this shop does not allow this.' });
}
