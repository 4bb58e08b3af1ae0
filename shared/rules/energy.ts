import type { Material } from '../domain/materials';
import { finding } from './findings';
import { assumedTerm, figure, quantity, term, termOf } from './figures';
import type { SourceId } from './sources';
import type { Figure, Finding } from './types';

interface EnergyRow {
  low: number;
  high: number;
  /** The row of the table it is taken from. */
  row: string;
  /** The table has no row of its own for the material. */
  assumed: boolean;
}

const LOW_CARBON = { low: 14, high: 68, row: 'low-carbon steel' };
const TOOL = { low: 18, high: 82, row: 'tool steel of 67 HRC' };

/** Specific energy in grinding, J/mm3. */
const ENERGY: Record<Material, EnergyRow> = {
  'plain-carbon-annealed': { ...LOW_CARBON, assumed: false },
  'plain-carbon-hardened': { ...TOOL, assumed: true },
  'alloy-annealed': { ...LOW_CARBON, assumed: true },
  'alloy-hardened': { ...TOOL, assumed: true },
  'tool-annealed': { ...TOOL, assumed: true },
  'tool-hardened': { ...TOOL, assumed: false },
  'cast-iron': { low: 12, high: 60, row: 'cast iron', assumed: false },
  stainless: { ...LOW_CARBON, assumed: true },
  'copper-alloy': { ...LOW_CARBON, assumed: true },
  'aluminium-alloy': { low: 7, high: 27, row: 'aluminium', assumed: false },
};

const BURN_CONSTANT = 6.2;
const BURN_FACTOR = 7.2;
const MM_PER_S_PER_M_PER_MIN = 1000 / 60;

/**
 * The energy it takes to grind away one cubic millimetre.
 *
 * Real values lie anywhere in a wide range, by wheel, dressing and wear: the mean of the range is worked with
 * and the range is carried along. A material without a row in the table takes its nearest one, and says so.
 *
 * @param material - work material; null while not chosen.
 * @returns geometric mean in J/mm3 (a thousand times the number in N/mm2), with the range as its band.
 * @source kalpakjian-energy
 * @example specificEnergy('cast-iron').value // 26.8 J/mm3
 * @example specificEnergy('cast-iron').band // { low: 12, high: 60 }
 */
export function specificEnergy(material: Material | null): Figure {
  const row = material === null ? null : ENERGY[material];
  const inTable = row?.assumed === true ? assumedTerm : term;
  const source: SourceId = row?.assumed === true ? 'memory-energy-assumed' : 'kalpakjian-energy';
  const mean = figure({
    unit: 'J/mm3',
    formula: '{u} = √({u_low} {u_high})',
    source,
    terms: [
      inTable('u_low', 'least in the table', [row?.low ?? null, 'J/mm3']),
      inTable('u_high', 'most in the table', [row?.high ?? null, 'J/mm3']),
    ],
    compute: (low, high) => Math.sqrt(low * high),
    note: row === null ? undefined : `From the row for ${row.row}.`,
  });
  return row === null ? mean : { ...mean, band: { low: row.low, high: row.high } };
}

/**
 * The specific energy above which dry grinding burns steel.
 *
 * @param equivalent - equivalent diameter, mm.
 * @param infeedMm - infeed on radius, mm, over 0.
 * @param workMPerMin - work speed, m/min, over 0.
 * @returns J/mm3, unrounded; never under 6.2.
 * @source malkin-burn
 * @example burnThreshold(equivalentDiameter(25, 50, 'inside'), 0.01, 15).value // 44.5 J/mm3
 */
export function burnThreshold(
  equivalent: Figure,
  infeedMm: number | null,
  workMPerMin: number | null,
): Figure {
  return figure({
    unit: 'J/mm3',
    formula: '{u_c} = 6.2 + 7.2 {d_e}^¼ / ({a}^¾ √(1 000 {v_w} / 60))',
    source: 'malkin-burn',
    terms: [
      termOf('d_e', 'equivalent diameter', equivalent),
      term('a', 'infeed on radius', [infeedMm, 'mm']),
      term('v_w', 'work speed', [workMPerMin, 'm/min']),
    ],
    compute: (diameter, infeed, work) =>
      BURN_CONSTANT +
      (BURN_FACTOR * diameter ** 0.25) /
        (infeed ** 0.75 * Math.sqrt(work * MM_PER_S_PER_M_PER_MIN)),
    note: 'For steel, ground dry.',
  });
}

/**
 * The deepest dry infeed at which a specific energy stays under the burning threshold.
 *
 * @param energy - specific energy, J/mm3.
 * @param equivalentMm - equivalent diameter, mm, over 0.
 * @param workMPerMin - work speed, m/min, over 0.
 * @returns mm on radius, unrounded; null while an argument is, or when the energy never reaches the threshold.
 * @source malkin-burn
 * @example deepestWithoutBurn(44.53, 50, 15) // 0.0100 mm
 */
export function deepestWithoutBurn(
  energy: number | null,
  equivalentMm: number | null,
  workMPerMin: number | null,
): number | null {
  if (energy === null || equivalentMm === null || workMPerMin === null) return null;
  if (!(energy > BURN_CONSTANT && equivalentMm > 0 && workMPerMin > 0)) return null;
  const root = Math.sqrt(workMPerMin * MM_PER_S_PER_M_PER_MIN);
  return ((BURN_FACTOR * equivalentMm ** 0.25) / ((energy - BURN_CONSTANT) * root)) ** (4 / 3);
}

/**
 * What the burning threshold says about a dry infeed.
 *
 * @param energy - from specificEnergy, with its band.
 * @param threshold - from burnThreshold.
 * @param infeedMm - infeed on radius, mm.
 * @returns a check when even a free-cutting wheel is above the threshold, a note when an ordinary one is, or
 * nothing.
 * @source malkin-burn
 * @example burnFindings(specificEnergy(null), burnThreshold(equivalentDiameter(25, 50, 'inside'), 0.01, 15), 0.01) // []
 */
export function burnFindings(
  energy: Figure,
  threshold: Figure,
  infeedMm: number | null,
): Finding[] {
  if (energy.value === null || threshold.value === null || infeedMm === null) return [];
  const figures = { infeed: quantity(infeedMm, 'mm') };
  if ((energy.band?.low ?? energy.value) > threshold.value)
    return [finding('burn-likely', { figures })];
  return energy.value > threshold.value ? [finding('burn-possible', { figures })] : [];
}
