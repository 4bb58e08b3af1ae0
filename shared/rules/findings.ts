import { CUT_FINDINGS } from './findings-cut';
import { MACHINE_FINDINGS } from './findings-machine';
import { WHEEL_FINDINGS } from './findings-wheel';
import { WORK_FINDINGS } from './findings-work';
import type { FindingCatalogue } from './finding-catalogue';
import type { Finding, Quantity } from './types';

/** The words of everything the rules can find, by code. */
export const FINDINGS = {
  ...MACHINE_FINDINGS,
  ...WHEEL_FINDINGS,
  ...WORK_FINDINGS,
  ...CUT_FINDINGS,
} as const satisfies FindingCatalogue;

export type FindingCode = keyof typeof FINDINGS;

type Details = Partial<Pick<Finding, 'level' | 'figures' | 'names' | 'part'>>;

/**
 * A finding at its usual level unless another is named.
 *
 * @param code - which finding.
 * @param details - level, figures and names.
 * @returns the finding.
 */
export function finding(code: FindingCode, details: Details = {}): Finding {
  const { part, levels, source } = FINDINGS[code];
  return { code, part, level: levels[0], figures: {}, names: {}, source, ...details };
}

/**
 * A finding in words, its figures and names set in.
 *
 * @param found - the finding.
 * @param format - writes a quantity in the reader's unit and digits.
 * @returns what was found, and what to do next.
 * @source none: the words are our own
 * @example findingWords(finding('unmarked-wheel'), ({ value }) => String(value)).title // 'No speed is marked for this wheel, so it must not run.'
 */
export function findingWords(
  found: Finding,
  format: (quantity: Quantity) => string,
): { title: string; remedy: string } {
  const { title, remedy } = FINDINGS[found.code];
  const fill = (words: string) =>
    words.replace(/\{(\w+)\}/g, (_, key: string) => {
      const quantity = found.figures[key];
      return quantity === undefined ? (found.names[key] ?? '') : format(quantity);
    });
  return { title: fill(title), remedy: fill(remedy) };
}
