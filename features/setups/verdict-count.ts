import type { Plan } from '@/shared/rules';

/** What the verdict's badge counts: needs while incomplete, else the findings of its own level. */
export function verdictCount({ verdict, needs, findings }: Plan): number {
  if (verdict === 'incomplete') return needs.length;
  return findings.filter(({ level }) => level === verdict).length;
}
