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
