import type { SourceId } from '../sources';

interface Stated {
  /** What is checked, in plain words. */
  checks: string;
  /** What the source starts from, in its own units. */
  inputs: string;
  /** Page, section or example, where it is narrower than the source's own place in the registry. */
  at?: string;
  /** What must be known to judge the check: how far the source itself goes. */
  note?: string;
}

/**
 * How far the answer may be off the source's: the rounding of the source, in its unit or as a share of the value;
 * 'exact' where the source does not round.
 */
export type Tolerance = { within: number } | { share: number } | 'exact';

export interface NumberCheck extends Stated {
  /** As the source states it, in its own unit: a literal, never worked out. */
  expected: number;
  /** How the source writes it, where a decimal number would read otherwise: "3/8". */
  printed?: string;
  unit: string;
  tolerance: Tolerance;
  /** Asks the rules; null when they have no answer. */
  got: () => number | null;
}

export interface WordCheck extends Stated {
  /** As the source states it: a mark, a verdict, the name of a limit. */
  expected: string;
  got: () => string | null;
}

export type PublishedCheck = NumberCheck | WordCheck;

/** One check against something outside the project. */
export type PublishedCase = PublishedCheck & { source: SourceId };

export interface Outcome {
  got: number | string | null;
  ok: boolean;
}
