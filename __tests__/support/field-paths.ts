type Path = (string | number)[];

/** Paths of every value in a request that is not itself made of values; of a list, its first item only. */
export function leavesOf(value: unknown, at: Path = []): Path[] {
  if (Array.isArray(value)) return value.length > 0 ? leavesOf(value[0], [...at, 0]) : [];
  if (typeof value === 'object' && value !== null)
    return Object.entries(value).flatMap(([key, inner]) => leavesOf(inner, [...at, key]));
  return [at];
}

/** A copy with one value exchanged; with undefined, the field is left out. */
export function withValue<T>(body: T, [key, ...rest]: Path, value: unknown): T {
  if (key === undefined) return value as T;
  const copy = (Array.isArray(body) ? [...body] : { ...body }) as Record<string | number, unknown>;
  copy[key] = withValue(copy[key], rest, value);
  return copy as T;
}

export const dotted = (path: Path) => path.join('.');
