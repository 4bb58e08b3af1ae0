import type { Refusal } from './refusals';

const UNIQUE_VIOLATION = '23505';

/** Runs a write; where the database says that something is in use already, refuses in the words for that index. */
export async function keepingUnique<T>(
  write: Promise<T>,
  refusals: Readonly<Record<string, Refusal>>,
): Promise<T> {
  try {
    return await write;
  } catch (error) {
    throw refusals[violatedIndex(error) ?? ''] ?? error;
  }
}

function violatedIndex(error: unknown): string | undefined {
  const cause: unknown = error instanceof Error ? error.cause : undefined;
  if (!(cause instanceof Error) || !('code' in cause) || !('constraint' in cause)) return undefined;
  return cause.code === UNIQUE_VIOLATION ? String(cause.constraint) : undefined;
}
