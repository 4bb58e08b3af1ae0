import type { Material } from '../domain/materials';
import { MM_PER_FOOT, MM_PER_INCH } from '../units/constants';
import type { SourceId } from './sources';

/** What the handbook recommends for one work material; depths are radial. */
export interface WorkRow {
  workSpeedMPerMin: number;
  roughInfeedMm: number;
  finishInfeedMm: { low: number; high: number };
  /** Traverse per work revolution as a share of the wheel's width. */
  roughTraverseShare: number;
  finishTraverseShare: number;
  /** Plunge infeed per work revolution, mm. */
  plungeInfeedMm: { rough: number; finish: number };
  source: SourceId;
}

interface Printed {
  feetPerMin: number;
  finishInches: [low: number, high: number];
  shares: [rough: number, finish: number];
  plungeInches: [rough: number, finish: number];
  source?: SourceId;
}

const ROUGH_INCHES = 0.002;
const SOFT: [number, number] = [0.0005, 0.0002];
const HARD_PLAIN: [number, number] = [0.0002, 0.00005];
const HARD_ALLOY: [number, number] = [0.0001, 0.000025];

const ANNEALED: Printed = {
  feetPerMin: 100,
  finishInches: [0.0005, 0.0005],
  shares: [1 / 2, 1 / 6],
  plungeInches: SOFT,
};

/** As printed, in feet and inches; cast iron and stainless go by plain carbon steel, annealed. */
const PRINTED: Record<Material, Printed> = {
  'plain-carbon-annealed': ANNEALED,
  'plain-carbon-hardened': {
    feetPerMin: 70,
    finishInches: [0.0003, 0.0005],
    shares: [1 / 4, 1 / 8],
    plungeInches: HARD_PLAIN,
  },
  'alloy-annealed': ANNEALED,
  'alloy-hardened': {
    feetPerMin: 70,
    finishInches: [0.0002, 0.0005],
    shares: [1 / 4, 1 / 8],
    plungeInches: HARD_ALLOY,
  },
  'tool-annealed': { ...ANNEALED, feetPerMin: 60 },
  'tool-hardened': {
    feetPerMin: 50,
    finishInches: [0.0001, 0.0005],
    shares: [1 / 4, 1 / 8],
    plungeInches: HARD_ALLOY,
  },
  'cast-iron': { ...ANNEALED, source: 'memory-materials' },
  stainless: { ...ANNEALED, source: 'memory-materials' },
  'copper-alloy': { ...ANNEALED, shares: [1 / 3, 1 / 6] },
  'aluminium-alloy': { ...ANNEALED, feetPerMin: 150, shares: [1 / 3, 1 / 6] },
};

/**
 * Work speed, infeed and traverse recommended for a material in cylindrical traverse grinding.
 *
 * @param material - the work's material.
 * @returns work speed in m/min, infeeds on radius in mm, traverse as a share of the wheel's width.
 * @source mh31-1318
 * @example workRow('tool-hardened').workSpeedMPerMin // 15.24
 */
export function workRow(material: Material): WorkRow {
  const { feetPerMin, finishInches, shares, plungeInches, source } = PRINTED[material];
  return {
    workSpeedMPerMin: (feetPerMin * MM_PER_FOOT) / 1000,
    roughInfeedMm: ROUGH_INCHES * MM_PER_INCH,
    finishInfeedMm: {
      low: finishInches[0] * MM_PER_INCH,
      high: finishInches[1] * MM_PER_INCH,
    },
    roughTraverseShare: shares[0],
    finishTraverseShare: shares[1],
    plungeInfeedMm: {
      rough: plungeInches[0] * MM_PER_INCH,
      finish: plungeInches[1] * MM_PER_INCH,
    },
    source: source ?? 'mh31-1318',
  };
}

/**
 * Whether rules that are known for steel alone hold for a material.
 *
 * @param material - the work's material.
 * @returns true for steels alone.
 */
export function isSteel(material: Material): boolean {
  return !NOT_STEEL.includes(material);
}

const NOT_STEEL: readonly Material[] = ['cast-iron', 'copper-alloy', 'aluminium-alloy'];
