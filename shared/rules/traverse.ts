import type { Material } from '../domain/materials';
import { finding } from './findings';
import { assumedTerm, figure, quantity, stated, term, termOf } from './figures';
import type { Figure, Finding, Plan } from './types';
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
 * A wheel wider than the surface stands over both ends alike.
 *
 * @param widthMm - wheel width, mm.
 * @param lengthMm - length of the ground surface, mm, no more than the width.
 * @returns mm at each end.
 */
export function overrunOfPlunge(widthMm: number | null, lengthMm: number): Figure {
  return figure({
    unit: 'mm',
    formula: '({T} - {L}) / 2',
    source: 'derived-geometry',
    terms: [
      term('T', 'wheel width', [widthMm, 'mm']),
      term('L', 'length of the ground surface', [lengthMm, 'mm']),
    ],
    compute: (width, length) => (width - length) / 2,
  });
}

/**
 * How far the carriage travels in one stroke, so that the wheel passes each end by the overrun.
 *
 * @param lengthMm - length of the ground surface, mm.
 * @param widthMm - wheel width, mm.
 * @param past - the overrun.
 * @param shoulders - ends at which the wheel stops at a shoulder instead.
 * @returns mm, 0 at least.
 * @source practice-overrun
 * @example travel(30, 12, overrun(12, null)).value // 26
 */
export function travel(
  lengthMm: number | null,
  widthMm: number | null,
  past: Figure,
  shoulders: 0 | 1 | 2 = 0,
): Figure {
  const open = 2 - shoulders;
  return figure({
    unit: 'mm',
    formula: open === 2 ? '{L} + 2 {o} - {T}' : open === 1 ? '{L} + {o} - {T}' : '{L} - {T}',
    source: 'practice-overrun',
    terms: [
      term('L', 'length of the ground surface', [lengthMm, 'mm']),
      termOf('o', 'overrun', past),
      term('T', 'wheel width', [widthMm, 'mm']),
    ],
    compute: (length, over, width) => Math.max(length + open * over - width, 0),
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

/**
 * Traverse aimed at where a hand turns the crank of the slide: a turn a second roughing, half a turn finishing,
 * and never more than the share of the wheel.
 *
 * @param aims - from traverseAims.
 * @param crank - what one turn moves the slide in mm, and the lathe's rpm; null while unknown.
 * @returns mm per work revolution; the aims themselves while the crank is unknown.
 * @source practice-crank
 * @example handAims(traverseAims(16, 'tool-hardened', { rough: 1 / 8, finish: 1 / 16 }), { perTurnMm: 2, rpm: 180 }).rough.value // 0.6667
 */
export function handAims(
  aims: TraverseAims,
  { perTurnMm, rpm }: { perTurnMm: number | null; rpm: number | null },
): TraverseAims {
  if (perTurnMm === null || rpm === null) return aims;
  const slowed = (aim: Figure, turnsPerMinute: number) =>
    figure({
      unit: 'mm/rev',
      formula: `the smaller of {s} and ${turnsPerMinute} {p} / {n_w}`,
      source: 'practice-crank',
      terms: [
        termOf('s', 'share of the wheel', aim),
        term('p', 'slide for one turn of the crank', [perTurnMm, 'mm']),
        term('n_w', 'lathe speed', [rpm, 'rpm']),
      ],
      compute: (share, perTurn, speed) => Math.min(share, (turnsPerMinute * perTurn) / speed),
      note: `Fed by hand, ${turnsPerMinute} turns of the crank a minute.`,
    });
  return { rough: slowed(aims.rough, 60), finish: slowed(aims.finish, 30) };
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

/**
 * Traverse in mm a minute, from mm per revolution and the lathe's rpm.
 *
 * @param traverse - mm per work revolution.
 * @param latheRpm - lathe speed, rpm.
 * @returns mm/min.
 */
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

/**
 * Seconds for one stroke of the carriage: what to count when traversing by hand.
 *
 * @param distance - travel of one stroke, mm.
 * @param rate - traverse, mm/min.
 * @returns seconds.
 */
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

/**
 * What is unusual about the overrun and the traverse.
 *
 * @param spec - wheel width in mm, side, traverse aimed at, whether it is by hand, and the traverse planned.
 * @returns findings; none where the wheel plunges.
 * @source practice-overrun
 * @example traverseFindings({ widthMm: 12, inside: true, aims: traverseAims(12, 'tool-hardened', { rough: 1 / 8, finish: 1 / 16 }), byHand: false, traverse: plan.traverse }) // []
 */
export function traverseFindings(spec: {
  widthMm: number | null;
  inside: boolean;
  aims: TraverseAims;
  byHand: boolean;
  traverse: Plan['traverse'];
}): Finding[] {
  const { widthMm, aims, traverse } = spec;
  if (widthMm === null || traverse.plunge) return [];
  return [
    ...overrunFindings(traverse.overrun.value, widthMm, spec.inside),
    ...stageFindings('rough', widthMm, [traverse.rough, aims.rough]),
    ...stageFindings('finish', widthMm, [traverse.finish, aims.finish]),
    ...(spec.byHand ? byHandFindings(traverse) : []),
  ];
}

function stageFindings(
  stage: string,
  widthMm: number,
  [planned, aim]: [Figure, Figure],
): Finding[] {
  if (planned.value === null || aim.value === null) return [];
  const traverse = quantity(planned.value, 'mm/rev');
  if (planned.value >= widthMm)
    return [
      finding('traverse-over-width', {
        figures: { traverse, width: quantity(widthMm, 'mm') },
        names: { stage },
      }),
    ];
  return planned.value > aim.value + 1e-9
    ? [
        finding('traverse-above-usual', {
          figures: { traverse, usual: quantity(aim.value, 'mm/rev') },
          names: { stage },
        }),
      ]
    : [];
}

function byHandFindings({ rough, secondsPerStroke: seconds }: Plan['traverse']): Finding[] {
  return rough.value === null || seconds.value === null
    ? []
    : [
        finding('hand-traverse', {
          figures: {
            traverse: quantity(rough.value, 'mm/rev'),
            seconds: quantity(seconds.value, 's'),
          },
        }),
      ];
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
