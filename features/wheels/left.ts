import type { RackWheel } from '@/shared/domain/wheels';

/** How much of the usable wheel is left, 0 to 1; null where its smallest diameter is not known. */
export function shareLeft({
  diameterNewMm,
  diameterNowMm,
  smallestUsableMm,
}: Pick<RackWheel, 'diameterNewMm' | 'diameterNowMm' | 'smallestUsableMm'>): number | null {
  if (smallestUsableMm === null || smallestUsableMm >= diameterNewMm) return null;
  const share = (diameterNowMm - smallestUsableMm) / (diameterNewMm - smallestUsableMm);
  return Math.min(Math.max(share, 0), 1);
}

const SLACK = 1e-9;

/** "84 %", rounded down; a dash where it is not known. */
export function leftWords(wheel: Parameters<typeof shareLeft>[0]): string {
  const share = shareLeft(wheel);
  return share === null ? '–' : `${Math.floor(share * 100 + SLACK)}\u00a0%`;
}
