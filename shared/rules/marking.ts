/** Aluminium oxide and silicon carbide wheels carry one system of marks, diamond and cBN another. */
export type WheelMarking = ConventionalMarking | SuperabrasiveMarking;

export interface ConventionalMarking {
  kind: 'conventional';
  /** The maker's own figures before the abrasive. */
  prefix: string | null;
  abrasive: ConventionalAbrasive;
  /** The letter that stood before the grain: F and # sizes differ, so it is kept. */
  grainScale: 'F' | '#' | null;
  grain: number;
  /** A soft to Z hard. */
  grade: string;
  /** 0 dense to 16 open. */
  structure: number | null;
  bond: ConventionalBond;
  /** The maker's own letters and figures after the bond. */
  suffix: string | null;
}

export interface SuperabrasiveMarking {
  kind: 'superabrasive';
  abrasive: 'D' | 'B';
  /** Micrometres of the FEPA sizes, or meshes to the inch. */
  grainScale: 'µm' | 'mesh';
  grain: number;
  grade: string | null;
  /** 100 is 4.4 carats to the cubic centimetre. */
  concentration: number | null;
  bond: SuperabrasiveBond;
  suffix: string | null;
}

export const CONVENTIONAL_ABRASIVES = ['WA', 'PA', 'HA', 'AZ', 'GC', 'A', 'C'] as const;
export type ConventionalAbrasive = (typeof CONVENTIONAL_ABRASIVES)[number];

export const CONVENTIONAL_BONDS = ['RF', 'BF', 'PL', 'MG', 'V', 'S', 'E', 'R', 'B', 'O'] as const;
export type ConventionalBond = (typeof CONVENTIONAL_BONDS)[number];

export const SUPERABRASIVE_BONDS = ['V', 'B', 'R', 'M', 'G'] as const;
export type SuperabrasiveBond = (typeof SUPERABRASIVE_BONDS)[number];

/** Macro and micro grains, coarse to fine. */
export const GRAINS: readonly number[] = [
  4, 5, 6, 7, 8, 10, 12, 14, 16, 20, 22, 24, 30, 36, 40, 46, 54, 60, 70, 80, 90, 100, 120, 150, 180,
  220, 230, 240, 280, 320, 360, 400, 500, 600, 800, 1000, 1200,
];

const MICRON_SIZES: readonly number[] = [
  46, 54, 64, 76, 91, 107, 126, 151, 181, 213, 251, 301, 356, 426, 501, 601, 711, 851, 1001, 1181,
];
const MESHES: readonly number[] = [
  16, 18, 20, 30, 35, 40, 45, 50, 60, 80, 100, 120, 140, 150, 170, 180, 200, 220, 230, 240, 270,
  320, 325, 400,
];
const MOST_STRUCTURE = 16;
const MOST_CONCENTRATION = 240;

/** What was looked for where a mark stops making sense. */
export type MarkingPart =
  'abrasive' | 'grain' | 'grade' | 'structure' | 'concentration' | 'bond' | 'suffix';

export type ParsedMarking =
  | { ok: true; marking: WheelMarking }
  /** `position` counts characters of the text as typed, from 0. */
  | { ok: false; position: number; part: MarkingPart };

/** Walks through a mark; spaces, dashes and strokes between its parts carry no meaning. */
class Reader {
  private at = 0;

  constructor(private readonly text: string) {}

  /** Takes what the pattern matches here, or nothing. */
  take(pattern: RegExp): string | null {
    this.skipSeparators();
    const found = new RegExp(pattern.source, 'y');
    found.lastIndex = this.at;
    const match = found.exec(this.text)?.[0] ?? null;
    if (match !== null) this.at += match.length;
    return match;
  }

  /** Takes a number and steps back when it is not one of those allowed. */
  takeNumber(allowed: (value: number) => boolean): number | null {
    const before = this.at;
    const digits = this.take(/\d{1,4}(?!\d)/);
    if (digits !== null && allowed(Number(digits))) return Number(digits);
    this.at = before;
    return null;
  }

  fault(part: MarkingPart): ParsedMarking {
    this.skipSeparators();
    return { ok: false, position: Math.min(this.at, this.text.length), part };
  }

  get done(): boolean {
    this.skipSeparators();
    return this.at >= this.text.length;
  }

  private skipSeparators(): void {
    while (/[\s\-/·,.]/.test(this.text.charAt(this.at))) this.at += 1;
  }
}

/**
 * Reads the specification marked on a wheel, as ISO 525 and ANSI B74.13 order it: abrasive, grain, grade,
 * structure where given, bond. Spaces, dashes and strokes between them may be there or not; capitals or not.
 *
 * @param text - the mark, for example "A 60 K 8 V" or "D126 R100 B".
 * @returns the parts; or the position, from 0, of the first character that does not fit and what was looked
 * for there.
 * @source iso-525
 * @example parseMarking('38A60-K8V') // { ok: true, marking: { kind: 'conventional', prefix: '38', abrasive: 'A', grainScale: null, grain: 60, grade: 'K', structure: 8, bond: 'V', suffix: null } }
 * @example parseMarking('A 61 K 8 V') // { ok: false, position: 2, part: 'grain' }
 */
export function parseMarking(text: string): ParsedMarking {
  const reader = new Reader(text.replace(/[a-z]/g, (letter) => letter.toUpperCase()));
  const prefix = reader.take(/\d{1,3}/);
  const conventional = reader.take(oneOf(CONVENTIONAL_ABRASIVES));
  if (conventional !== null) return readConventional(reader, { prefix, abrasive: conventional });
  const superabrasive = prefix === null ? reader.take(/[DB]/) : null;
  return superabrasive === null
    ? reader.fault('abrasive')
    : readSuperabrasive(reader, superabrasive);
}

function readConventional(
  reader: Reader,
  head: { prefix: string | null; abrasive: string },
): ParsedMarking {
  const grainScale = reader.take(/[F#]/);
  const grain = reader.takeNumber((value) => GRAINS.includes(value));
  if (grain === null) return reader.fault('grain');
  const grade = reader.take(/[A-Z]/);
  if (grade === null) return reader.fault('grade');
  const structure = reader.takeNumber((value) => value <= MOST_STRUCTURE);
  const bond = reader.take(oneOf(CONVENTIONAL_BONDS));
  if (bond === null) return reader.fault(reader.take(/(?=\d)/) === null ? 'bond' : 'structure');
  const suffix = reader.take(/[A-Z0-9]{1,8}/);
  if (!reader.done) return reader.fault('suffix');
  return {
    ok: true,
    marking: {
      kind: 'conventional',
      prefix: head.prefix,
      abrasive: oneIn(CONVENTIONAL_ABRASIVES, head.abrasive),
      grainScale: grainScale === null ? null : oneIn(['F', '#'] as const, grainScale),
      grain,
      grade,
      structure,
      bond: oneIn(CONVENTIONAL_BONDS, bond),
      suffix,
    },
  };
}

function readSuperabrasive(reader: Reader, abrasive: string): ParsedMarking {
  const grain = reader.takeNumber(
    (value) => MICRON_SIZES.includes(value) || MESHES.includes(value),
  );
  if (grain === null) return reader.fault('grain');
  const grade = reader.take(/[ABD-Z](?=[\s-]*(?:C[\s-]*)?\d)/);
  reader.take(/C(?=[\s-]*\d)/);
  const concentration = reader.takeNumber((value) => value > 0 && value <= MOST_CONCENTRATION);
  const bond = reader.take(oneOf(SUPERABRASIVE_BONDS));
  if (bond === null) return reader.fault(reader.take(/(?=\d)/) === null ? 'bond' : 'concentration');
  const suffix = reader.take(/[A-Z0-9/.]{1,8}/);
  if (!reader.done) return reader.fault('suffix');
  return {
    ok: true,
    marking: {
      kind: 'superabrasive',
      abrasive: oneIn(['D', 'B'] as const, abrasive),
      grainScale: MICRON_SIZES.includes(grain) ? 'µm' : 'mesh',
      grain,
      grade,
      concentration,
      bond: oneIn(SUPERABRASIVE_BONDS, bond),
      suffix,
    },
  };
}

/** Longer values stand first in their lists, so that "BF" is not read as "B". */
function oneOf(values: readonly string[]): RegExp {
  return new RegExp(values.join('|'));
}

/** The reader has matched one of the values already; this only tells the compiler which. */
function oneIn<T extends string>(values: readonly T[], value: string): T {
  const found = values.find((candidate) => candidate === value);
  if (found === undefined) throw new RangeError(`${value} is none of ${values.join(', ')}`);
  return found;
}

/**
 * A mark written the usual way: its parts in order, a space between them.
 *
 * @param marking - from parseMarking.
 * @returns the text; parseMarking reads it back to the same parts.
 * @source iso-525
 * @example writeMarking({ kind: 'conventional', prefix: null, abrasive: 'A', grainScale: 'F', grain: 60, grade: 'K', structure: 8, bond: 'V', suffix: null }) // 'A F60 K 8 V'
 */
export function writeMarking(marking: WheelMarking): string {
  const parts =
    marking.kind === 'conventional'
      ? [
          `${marking.prefix ?? ''}${marking.abrasive}`,
          `${marking.grainScale ?? ''}${marking.grain}`,
          marking.grade,
          marking.structure,
          marking.bond === 'MG' ? 'Mg' : marking.bond,
          marking.suffix,
        ]
      : [
          `${marking.abrasive}${marking.grain}`,
          marking.grade,
          marking.concentration === null ? null : `C${marking.concentration}`,
          marking.bond,
          marking.suffix,
        ];
  return parts.filter((part) => part !== null).join(' ');
}
