import type { MarkingPart, WheelMarking } from './marking';

export interface MarkingWord {
  part: MarkingPart;
  /** As it stands in the mark. */
  mark: string;
  /** In words. */
  means: string;
}

const ABRASIVES = {
  A: 'aluminium oxide: steel',
  WA: 'white aluminium oxide: hardened steel',
  PA: 'pink aluminium oxide: hardened and tool steel',
  HA: 'single-crystal aluminium oxide: hard alloy steel',
  AZ: 'alumina-zirconia: heavy stock',
  C: 'silicon carbide: cast iron, brass, aluminium',
  GC: 'green silicon carbide: carbide tools',
  D: 'diamond: carbide, glass, ceramics; not steel',
  B: 'cubic boron nitride (cBN): hardened steel',
} as const;

const CONVENTIONAL_BONDS = {
  V: 'vitrified',
  S: 'silicate',
  E: 'shellac',
  R: 'rubber',
  RF: 'rubber, reinforced',
  B: 'resin',
  BF: 'resin, reinforced with fibre',
  O: 'oxychloride',
  PL: 'plastic',
  MG: 'magnesia',
} as const;

const SUPERABRASIVE_BONDS = {
  V: 'vitrified',
  B: 'resin',
  R: 'resin',
  M: 'metal',
  G: 'electroplated',
} as const;

const COARSE_TO = 24;
const MEDIUM_TO = 60;
const FINE_TO = 220;
const DENSE_TO = 4;
const MEDIUM_STRUCTURE_TO = 8;
const CARATS_AT_100 = 4.4;

/**
 * What each part of a wheel's mark means, in the order it is written.
 *
 * @param marking - from parseMarking.
 * @returns one entry for each part that is there.
 * @source iso-525
 * @example explainMarking({ kind: 'superabrasive', abrasive: 'D', grainScale: 'µm', grain: 126, grade: null, concentration: 100, bond: 'B', suffix: null })[2] // { part: 'concentration', mark: 'C100', means: '4.4 carats in each cubic centimetre' }
 */
export function explainMarking(marking: WheelMarking): MarkingWord[] {
  const words = marking.kind === 'conventional' ? conventional(marking) : superabrasive(marking);
  return marking.suffix === null
    ? words
    : [...words, { part: 'suffix', mark: marking.suffix, means: "the maker's own mark" }];
}

/**
 * How hard a wheel holds its grains: A to H soft, I to P medium, Q to Z hard.
 *
 * @param grade - one capital letter, A to Z.
 * @returns the word for it.
 * @source memory-grade-words
 * @example gradeWord('K') // 'medium'
 */
export function gradeWord(grade: string): 'soft' | 'medium' | 'hard' {
  if (grade <= 'H') return 'soft';
  return grade <= 'P' ? 'medium' : 'hard';
}

/**
 * Whether the bond is organic: rubber, resin, shellac and plastic wheels do not ring like vitrified ones.
 *
 * @param marking - from parseMarking.
 * @returns true for organic bonds.
 * @source osha-1910-215-d1
 * @example isOrganicBond({ kind: 'conventional', prefix: null, abrasive: 'A', grainScale: null, grain: 60, grade: 'K', structure: 8, bond: 'BF', suffix: null }) // true
 */
export function isOrganicBond(marking: WheelMarking): boolean {
  const organic: readonly string[] =
    marking.kind === 'conventional' ? ['E', 'R', 'RF', 'B', 'BF', 'PL'] : ['B', 'R'];
  return organic.includes(marking.bond);
}

function conventional(marking: Extract<WheelMarking, { kind: 'conventional' }>): MarkingWord[] {
  const { abrasive, grain, grade, structure, bond } = marking;
  const maker = marking.prefix === null ? '' : `, the maker's kind ${marking.prefix}`;
  return [
    {
      part: 'abrasive',
      mark: `${marking.prefix ?? ''}${abrasive}`,
      means: ABRASIVES[abrasive] + maker,
    },
    {
      part: 'grain',
      mark: `${marking.grainScale ?? ''}${grain}`,
      means: `${grainWord(grain)} grain`,
    },
    { part: 'grade', mark: grade, means: `${gradeWord(grade)} grade, A soft to Z hard` },
    ...(structure === null
      ? []
      : [
          {
            part: 'structure' as const,
            mark: String(structure),
            means: `${structureWord(structure)} structure, 0 dense to 16 open`,
          },
        ]),
    { part: 'bond', mark: bond === 'MG' ? 'Mg' : bond, means: `${CONVENTIONAL_BONDS[bond]} bond` },
  ];
}

function superabrasive(marking: Extract<WheelMarking, { kind: 'superabrasive' }>): MarkingWord[] {
  const { abrasive, grain, grainScale, grade, concentration, bond } = marking;
  return [
    { part: 'abrasive', mark: abrasive, means: ABRASIVES[abrasive] },
    {
      part: 'grain',
      mark: String(grain),
      means: grainScale === 'µm' ? `grain of about ${grain} µm` : `grain of ${grain} mesh`,
    },
    ...(grade === null
      ? []
      : [{ part: 'grade' as const, mark: grade, means: `${gradeWord(grade)} grade` }]),
    ...(concentration === null
      ? []
      : [
          {
            part: 'concentration' as const,
            mark: `C${concentration}`,
            means: `${((concentration * CARATS_AT_100) / 100).toFixed(1)} carats in each cubic centimetre`,
          },
        ]),
    { part: 'bond', mark: bond, means: `${SUPERABRASIVE_BONDS[bond]} bond` },
  ];
}

function grainWord(grain: number): string {
  if (grain <= COARSE_TO) return 'coarse';
  if (grain <= MEDIUM_TO) return 'medium';
  return grain <= FINE_TO ? 'fine' : 'very fine';
}

function structureWord(structure: number): string {
  if (structure <= DENSE_TO) return 'dense';
  return structure <= MEDIUM_STRUCTURE_TO ? 'medium' : 'open';
}
