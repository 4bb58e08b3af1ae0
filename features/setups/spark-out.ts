import { readEntry, type QuantitySpec } from '@/features/forms';
import type { UnitSystem } from '@/shared/domain/people';
import type { Side } from '@/shared/domain/setups';
import type { SparkOutSilence } from '@/shared/rules/learning';

export const GAUGE_STEP: QuantitySpec = {
  label: 'Smallest step of the gauge',
  unit: 'mm',
  limit: 'gaugeStepMm',
};

export const SILENCE_WORDS: Record<SparkOutSilence, string> = {
  'too few': 'Three sizes or more are needed: they give two changes to compare.',
  'too small':
    'Fewer than two changes are larger than three steps of the gauge: they cannot be told from its own error.',
  'not shrinking':
    'The changes do not shrink from pass to pass the way spring works off, so they say nothing about it.',
  'out of range': 'What they give lies outside anything a plan can be made with.',
};

export interface TypedSizes {
  sizesMm: number[];
  /** The first that cannot be read, in words. */
  fault: string | null;
}

/** Reads a list of sizes, on diameter: one to a line or with semicolons between, in the order of the passes. */
export function readSizes(text: string, units: UnitSystem): TypedSizes {
  const sizesMm: number[] = [];
  const entries = text.split(/[;\n]/).filter((entry) => entry.trim() !== '');
  for (const [index, entry] of entries.entries()) {
    const { si, error } = readEntry(entry, sizeSpec(index), units);
    if (si === null) return { sizesMm, fault: error ?? null };
    sizesMm.push(si);
  }
  return { sizesMm, fault: null };
}

const sizeSpec = (index: number): QuantitySpec => ({
  label: `Size ${index + 1}`,
  unit: 'mm',
  limit: 'diameterMm',
});

/** What each pass took, on diameter; shafts get smaller, bores larger. */
export const changesOf = (sizesMm: readonly number[], side: Side): number[] =>
  sizesMm
    .slice(1)
    .map((size, index) => (side === 'outside' ? 1 : -1) * ((sizesMm[index] ?? size) - size));
