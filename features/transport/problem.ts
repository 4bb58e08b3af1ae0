import { problemDetails, type ProblemDetails } from '@/shared/contracts/problem';

/**
 * Everything that can go wrong between the screen and the server, as one type.
 * `network` and `timeout` may pass by themselves; `bad-data` means the answer was not of the agreed shape;
 * `refused` is the server's own word.
 */
export type Problem =
  | { kind: 'network' }
  | { kind: 'timeout' }
  | { kind: 'bad-data'; detail: string }
  | { kind: 'refused'; details: ProblemDetails };

export class ProblemError extends Error {
  constructor(readonly problem: Problem) {
    super(problemWords(problem));
    this.name = 'ProblemError';
  }
}

/** The problem behind whatever was thrown; anything unknown counts as bad data. */
export function problemOf(error: unknown): Problem {
  if (error instanceof ProblemError) return error.problem;
  return { kind: 'bad-data', detail: error instanceof Error ? error.message : String(error) };
}

/** The refusal of a response that is not a success. */
export async function refusalOf(response: Response): Promise<Problem> {
  const body: unknown = await response.json().catch(() => null);
  const parsed = problemDetails.safeParse(body);
  // A proxy in between answers in its own words when the server behind it is gone.
  if (!parsed.success) return { kind: 'network' };
  return { kind: 'refused', details: parsed.data };
}

/** What a person reads about a problem, and what to do next. */
export function problemWords(problem: Problem): string {
  switch (problem.kind) {
    case 'network':
      return 'The server cannot be reached. What you typed is kept on this device; try again when the network is back.';
    case 'timeout':
      return 'The server took too long to answer. What you typed is kept; try again.';
    case 'bad-data':
      return 'The server answered in a way this page does not understand. Reload the page; what you typed is kept.';
    case 'refused':
      return problem.details.detail ?? problem.details.title;
  }
}

/** True for a refusal with this code. */
export function isRefusal(error: unknown, code: ProblemDetails['code']): boolean {
  const problem = problemOf(error);
  return problem.kind === 'refused' && problem.details.code === code;
}
