import {
  CONVENTIONAL_BONDS,
  parseMarking,
  SUPERABRASIVE_BONDS,
  writeMarking,
  type MarkingPart,
  type ParsedMarking,
} from '@/shared/rules/marking';

export const MARKING_PART_WORDS: Record<MarkingPart, string> = {
  abrasive: 'Abrasive',
  grain: 'Grain',
  grade: 'Grade',
  structure: 'Structure',
  concentration: 'Concentration',
  bond: 'Bond',
  suffix: 'Maker’s mark',
};

type Fault = Extract<ParsedMarking, { ok: false }>;

const bonds = (marks: readonly string[]) =>
  `${marks.slice(0, -1).join(', ')} or ${marks.at(-1) ?? ''}`.replace('MG', 'Mg');

/** What each position takes, in the marks of aluminium oxide and silicon carbide, and of diamond and cBN. */
const EXPECTED: Record<'conventional' | 'superabrasive', Record<MarkingPart, string>> = {
  conventional: {
    abrasive: 'A or C, with or without a prefix (38A, WA, GC), D for diamond or B for cBN',
    grain: 'a size from 4 to 1200, like 46, F60 or 80',
    grade: 'one letter, A soft to Z hard',
    structure: 'a number from 0 dense to 16 open, or nothing',
    concentration: 'nothing',
    bond: bonds(CONVENTIONAL_BONDS),
    suffix: 'at most 8 letters and figures',
  },
  superabrasive: {
    abrasive: 'D for diamond or B for cBN',
    grain: 'a size in µm like 126, or a mesh like 120',
    grade: 'one letter, or nothing',
    structure: 'nothing',
    concentration: 'a number like C100, at most 240, or nothing',
    bond: bonds(SUPERABRASIVE_BONDS),
    suffix: 'at most 8 letters and figures',
  },
};

export interface MarkingReading {
  parsed: ParsedMarking;
  /** The mark as it is usually written; null where it does not read. */
  written: string | null;
  /** Which position is at fault and what belongs there; null where the mark reads or just ends too soon. */
  fault: string | null;
  /** What comes next in a mark that ends too soon; null otherwise. */
  next: string | null;
}

/** Reads a mark as it is typed; null for an empty one. */
export function readMarking(text: string): MarkingReading | null {
  if (text.trim() === '') return null;
  const parsed = parseMarking(text);
  if (parsed.ok) return { parsed, written: writeMarking(parsed.marking), fault: null, next: null };
  const part = MARKING_PART_WORDS[parsed.part].toLowerCase();
  const expected = expectedAt(text, parsed);
  const rest = text.slice(parsed.position).trim();
  return rest === ''
    ? { parsed, written: null, fault: null, next: `Next comes the ${part}: ${expected}.` }
    : {
        parsed,
        written: null,
        fault: `At “${rest}” the ${part} is expected: ${expected}.`,
        next: null,
      };
}

function expectedAt(text: string, { part }: Fault): string {
  const kind =
    part !== 'abrasive' && /^[^a-z\d]*[db]/i.test(text) ? 'superabrasive' : 'conventional';
  return EXPECTED[kind][part];
}
