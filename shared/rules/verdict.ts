import type { Verdict } from '../domain/setups';
import type { Finding, Need } from './types';

/**
 * What a plan comes to. Something known to be wrong wins over anything missing; notes never colour it.
 *
 * @param findings - all findings of the plan.
 * @param needs - what is still missing.
 * @returns stop, else incomplete, else check, else clear.
 * @source none: the order is our own
 * @example verdictOf([], []) // 'clear'
 */
export function verdictOf(findings: readonly Finding[], needs: readonly Need[]): Verdict {
  if (findings.some(({ level }) => level === 'stop')) return 'stop';
  if (needs.length > 0) return 'incomplete';
  return findings.some(({ level }) => level === 'check') ? 'check' : 'clear';
}

const GRAVITY: readonly Finding['level'][] = ['stop', 'check', 'note'];

/**
 * Findings with the gravest first, and otherwise in the order in which they were found.
 *
 * @param findings - in any order.
 * @returns a new list.
 */
export function byGravity(findings: readonly Finding[]): Finding[] {
  return GRAVITY.flatMap((level) => findings.filter((finding) => finding.level === level));
}
