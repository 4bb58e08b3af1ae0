import type { SetupPart } from '../domain/setups';
import type { SourceId } from './sources';
import type { Finding } from './types';

/** Words of one finding. `{key}` in them stands for the figure or name of that key. */
export interface FindingEntry {
  part: SetupPart;
  /** The levels it can be raised at, the usual one first. */
  levels: readonly [Finding['level'], ...Finding['level'][]];
  title: string;
  /** What to do next. */
  remedy: string;
  source: SourceId;
}

export type FindingCatalogue = Record<string, FindingEntry>;
