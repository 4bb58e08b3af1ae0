import { taken } from './refusals';

const UNIQUE_VIOLATION = '23505';

interface TakenName {
  /** Name of the unique index. */
  index: string;
  path: string;
  message: string;
}

/** Runs a write, and turns the database's word that a name is in use into a refusal at its field. */
export async function keepingUnique<T>(write: Promise<T>, ...names: TakenName[]): Promise<T> {
  try {
    return await write;
  } catch (error) {
    const name = names.find(({ index }) => index === violatedIndex(error));
    throw name ? taken(name.path, name.message) : error;
  }
}

function violatedIndex(error: unknown): string | undefined {
  const cause: unknown = error instanceof Error ? error.cause : undefined;
  if (!(cause instanceof Error) || !('code' in cause) || !('constraint' in cause)) return undefined;
  return cause.code === UNIQUE_VIOLATION ? String(cause.constraint) : undefined;
}
