import { v7 } from 'uuid';

/** A new id, made here so that sending the same thing twice is harmless. */
export function newId(): string {
  return v7();
}
