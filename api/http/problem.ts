import type { Response } from 'express';

import type { ProblemCode, ProblemDetails } from '@/shared/contracts/problem';

const PROBLEMS: Record<ProblemCode, { status: number; title: string }> = {
  'invalid-json': { status: 400, title: 'The body is not JSON' },
  'invalid-body': { status: 400, title: 'Some fields cannot be taken as they are' },
  'invalid-query': { status: 400, title: 'The query cannot be taken as it is' },
  unauthenticated: { status: 401, title: 'Nobody is signed in' },
  forbidden: { status: 403, title: 'Not allowed' },
  'cross-site': { status: 403, title: 'Sent from another site' },
  'not-found': { status: 404, title: 'Not found' },
  'method-not-allowed': { status: 405, title: 'Not possible here' },
  'stale-version': { status: 409, title: 'Changed in the meantime' },
  'id-reused': { status: 409, title: 'The id is in use' },
  'name-taken': { status: 409, title: 'The name is in use' },
  'too-large': { status: 413, title: 'Too large' },
  'unsupported-media-type': { status: 415, title: 'Only JSON is read here' },
  'refused-by-rule': { status: 422, title: 'A rule forbids it' },
  'too-many-requests': { status: 429, title: 'Too many requests' },
  internal: { status: 500, title: 'Something failed on the server' },
  unavailable: { status: 503, title: 'The server cannot answer now' },
};

type Details = Pick<ProblemDetails, 'detail' | 'errors' | 'current' | 'rule'>;

/** Answers with problem details (RFC 9457). */
export function sendProblem(res: Response, code: ProblemCode, details: Details = {}): void {
  const { status, title } = PROBLEMS[code];
  const body: ProblemDetails = {
    type: `/problems/${code}`,
    title,
    status,
    code,
    requestId: String(res.req.id),
    ...details,
  };
  res
    .status(status)
    .set('Cache-Control', 'no-store')
    .type('application/problem+json')
    .send(JSON.stringify(body));
}
