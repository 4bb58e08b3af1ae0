import type { Material } from '../domain/materials';
import { finding } from './findings';
import { assumedTerm, figure, quantity, stated, term, termOf } from './figures';
import { positive } from './surface';
import type { Figure, Finding } from './types';
import { workRow } from './work-table';

const OVERRUN_SHARE = 1 / 3;
const BELL_MOUTH_SHARE = 1 / 2;
const TIGHT_SHARE = 1 / 4;

/**
 * How far the wheel runs past each end of the surface.
 *
 * @param widthMm - wheel width, mm; null while unknown.
 * @param typedMm - overrun chosen instead, mm, 0 or more.
 * @returns mm; a third of the width unless chosen.
 * @source practice-overrun
 * @example overrun(12, null).value // 4
 */
export function overrun(widthMm: number | null, typedMm: number | null): Figure {
  return typedMm !== null
    ? stated('overrun, chosen', [typedMm, 'mm'])
    : figure({
        unit: 'mm',
        formula: '{o} = {T} / 3',
        source: 'practice-overrun',
        terms: [term('T', 'wheel width', [widthMm, 'mm'])],
        compute: (width) => width * OVERRUN_SHARE,
      });
}

/**
 * How far the carriage travels in one stroke, so that the wheel passes each end by the overrun.
 *
 * @param lengthMm - length of the ground surface, mm.
 * @param widthMm - wheel width, mm.
 * @param past - the overrun.
 * @returns mm, 0 at least.
 * @source practice-overrun
 * @example travel(30, 12, overrun(12, null)).value // 26
 */
export function travel(lengthMm: number | null, widthMm: number | null, past: Figure): Figure {
  return figure({
    unit: 'mm',
    formula: '{L} + 2 {o} - {T}',
    source: 'practice-overrun',
    terms: [
      term('L', 'length of the ground surface', [lengthMm, 'mm']),
      termOf('o', 'overrun', past),
      term('T', 'wheel width', [widthMm, 'mm']),
    ],
    compute: (length, over, width) => Math.max(length + 2 * over - width, 0),
  });
}

export interface TraverseAims {
  rough: Figure;
  finish: Figure;
}

/**
 * The traverse aimed at: a share of the wheel's width for each turn of the work, the smaller of the
 * handbook's and the shop's for a tool-post grinder.
 *
 * @param widthMm - wheel width, mm; null while unknown.
 * @param material - the work's material; null while unknown.
 * @param shares - the shop's largest shares, rough and finish.
 * @returns mm per work revolution, unrounded.
 * @source mh31-1318
 * @example traverseAims(12, 'tool-hardened', { rough: 1 / 8, finish: 1 / 16 }).rough.value // 1.5
 */
export function traverseAims(
  widthMm: number | null,
  material: Material | null,
  shares: { rough: number; finish: number },
): TraverseAims {
  const row = material === null ? null : workRow(material);
  const aim = (table: number | null, shop: number) =>
    figure({
      unit: 'mm/rev',
      formula: '{s} = {T} · the smaller of {c_table} and {c_shop}',
      source: table !== null && table < shop ? 'mh31-1318' : 'memory-traverse-share',
      terms: [
        term('T', 'wheel width', [widthMm, 'mm']),
        term('c_table', 'share in the table', [table, '1']),
        assumedTerm('c_shop', 'most on a tool-post grinder', [shop, '1']),
      ],
      compute: (width, first, second) => width * Math.min(first, second),
    });
  return {
    rough: aim(row?.roughTraverseShare ?? null, shares.rough),
    finish: aim(row?.finishTraverseShare ?? null, shares.finish),
  };
}

/** A traverse that can be set: one of the lathe's feeds, or by hand where all of them are coarser. */
export interface Feed {
  mmPerRev: number;
  byHand: boolean;
}

/**
 * The largest feed of the lathe that is not above a wanted one.
 *
 * @param feeds - the lathe's feeds, mm per revolution, in any order.
 * @param wantedMm - the traverse wanted, mm per revolution, over 0.
 * @returns the feed; the wanted traverse itself, by hand, where every feed is coarser.
 * @source practice-crank
 * @example feedAtMost([0.1, 0.2, 0.4], 0.3) // { mmPerRev: 0.2, byHand: false }
 */
export function feedAtMost(feeds: readonly number[], wantedMm: number): Feed {
  let best = 0;
  for (const feed of feeds) if (feed <= wantedMm + 1e-9 && feed > best) best = feed;
  return best > 0 ? { mmPerRev: best, byHand: false } : { mmPerRev: wantedMm, byHand: true };
}

/** Traverse in mm a minute, from mm per revolution and the lathe's rpm. */
export function traverseRate(traverse: Figure, latheRpm: Figure): Figure {
  return figure({
    unit: 'mm/min',
    formula: '{s} {n_w}',
    source: 'mh31-1318',
    terms: [
      termOf('s', 'traverse per work revolution', traverse),
      termOf('n_w', 'lathe speed', latheRpm),
    ],
    compute: (perRev, rpm) => perRev * rpm,
  });
}

/** Seconds for one stroke of the carriage: what to count when traversing by hand. */
export function secondsPerStroke(distance: Figure, rate: Figure): Figure {
  return figure({
    unit: 's',
    formula: '60 {travel} / {rate}',
    source: 'derived-time',
    terms: [
      termOf('travel', 'travel of one stroke', distance),
      termOf('rate', 'traverse a minute, roughing', rate),
    ],
    compute: (mm, perMin) => (60 * mm) / perMin,
  });
}

/** What is unusual about the overrun and the traverse. */
export function traverseFindings(spec: {
  widthMm: number | null;
  inside: boolean;
  overrun: Figure;
  aims: TraverseAims;
  rough: Figure;
  finish: Figure;
  byHand: boolean;
  seconds: Figure;
}): Finding[] {
  const { widthMm } = spec;
  const found: Finding[] = [];
  if (widthMm === null) return found;
  found.push(...overrunFindings(spec.overrun.value, widthMm, spec.inside));
  const stages = [
    ['rough', spec.rough.value, spec.aims.rough.value],
    ['finish', spec.finish.value, spec.aims.finish.value],
  ] as const;
  for (const [stage, traverse, usual] of stages) {
    if (traverse === null || usual === null) continue;
    const figures = { traverse: quantity(traverse, 'mm/rev') };
    if (traverse >= widthMm)
      found.push(
        finding('traverse-over-width', {
          figures: { ...figures, width: quantity(widthMm, 'mm') },
          names: { stage },
        }),
      );
    else if (traverse > usual + 1e-9)
      found.push(
        finding('traverse-above-usual', {
          figures: { ...figures, usual: quantity(usual, 'mm/rev') },
          names: { stage },
        }),
      );
  }
  if (spec.byHand && spec.rough.value !== null && spec.seconds.value !== null)
    found.push(
      finding('hand-traverse', {
        figures: {
          traverse: quantity(spec.rough.value, 'mm/rev'),
          seconds: quantity(spec.seconds.value, 's'),
        },
      }),
    );
  return found;
}

function overrunFindings(past: number | null, widthMm: number, inside: boolean): Finding[] {
  if (past === null) return [];
  const figures = {
    overrun: quantity(past, 'mm'),
    usual: quantity(widthMm * OVERRUN_SHARE, 'mm'),
  };
  if (inside && past > widthMm * BELL_MOUTH_SHARE)
    return [finding('overrun-bell-mouths', { figures })];
  return past < widthMm * TIGHT_SHARE ? [finding('overrun-leaves-tight', { figures })] : [];
}

/** The typed traverse, or null where it is not a traverse at all. */
export function typedTraverse(typedMm: number | null): Figure | null {
  return positive(typedMm) === null ? null : stated('traverse, chosen', [typedMm, 'mm/rev']);
}
