import type { DressInputs } from '../domain/setups';
import type { ShopRules } from '../domain/shop-rules';
import { MM_PER_INCH } from '../units/constants';
import { smallestDiamond, type DressingConditions } from './diamond';
import { assumedTerm, figure, quantity, term, termOf } from './figures';
import { finding } from './findings';
import type { DressStage, Figure, Finding } from './types';

/** Depth aimed at and passes taken where none are given, mm on the wheel's radius. */
/** Printed as 0.025 mm and as 0.001 in: the same limit, so a dial in inches may stand on it. */
const MOST_DEPTH_MM = MM_PER_INCH / 1000;
const LEAST_OVERLAP = 2;
/** The diamond starts beside the wheel and leaves it again, a millimetre either side. */
const OVERRUN_MM = 2;
const SLACK = 1e-9;
const SECONDS_PER_MINUTE = 60;

type Stage = 'rough' | 'finish';

/**
 * How wide a groove the diamond's tip cuts into the wheel.
 *
 * @param tipRadiusMm - radius of the tip, mm, over 0.
 * @param depthMm - depth of dressing on the wheel's radius, mm, over 0.
 * @param assumed - whether the radius is assumed, since nobody gave it.
 * @returns width, mm, unrounded; null when the depth is more than the tip's radius.
 * @source derived-dressing
 * @example dressWidth(0.38, 0.025, false).value // 0.2711 mm
 */
export function dressWidth(
  tipRadiusMm: number | null,
  depthMm: number | null,
  assumed: boolean,
): Figure {
  return figure({
    unit: 'mm',
    formula: '{b_d} = 2 √(2 {r_d} {a_d} - {a_d}²)',
    source: 'derived-dressing',
    terms: [
      (assumed ? assumedTerm : term)('r_d', 'tip radius of the diamond', [tipRadiusMm, 'mm']),
      term('a_d', 'depth of dressing', [depthMm, 'mm']),
    ],
    compute: (radius, depth) =>
      depth > radius ? null : 2 * Math.sqrt(2 * radius * depth - depth ** 2),
  });
}

/**
 * How far the diamond moves along the wheel in one turn of it.
 *
 * @param width - from dressWidth.
 * @param overlap - how many turns each point of the wheel is under the diamond, 1 or more.
 * @returns lead, mm per wheel revolution, unrounded.
 * @source modern-grinding-dressing
 * @example dressLead(dressWidth(0.38, 0.025, false), 2).value // 0.1356 mm/rev
 */
export function dressLead(width: Figure, overlap: number | null): Figure {
  return figure({
    unit: 'mm/rev',
    formula: '{f_d} = {b_d} / {U_d}',
    source: 'modern-grinding-dressing',
    terms: [
      termOf('b_d', 'width that the diamond cuts', width),
      term('U_d', 'overlap', [overlap, '1']),
    ],
    compute: (cut, ratio) => (ratio > 0 ? cut / ratio : null),
  });
}

/**
 * How fast the diamond crosses the wheel.
 *
 * @param lead - mm per wheel revolution.
 * @param spindle - wheel speed, rpm.
 * @returns mm/min, unrounded.
 * @source modern-grinding-dressing
 * @example dressTraverse(dressLead(dressWidth(0.38, 0.025, false), 2), stated('spindle speed', [1410, 'rpm'])).value // 191 mm/min
 */
export function dressTraverse(lead: Figure, spindle: Figure): Figure {
  return figure({
    unit: 'mm/min',
    formula: '{v_fd} = {f_d} {n_s}',
    source: 'modern-grinding-dressing',
    terms: [termOf('f_d', 'lead', lead), termOf('n_s', 'spindle speed', spindle)],
    compute: (step, rpm) => step * rpm,
  });
}

/**
 * How long one crossing takes, so that it can be counted out by hand.
 *
 * @param widthMm - wheel width, mm, over 0.
 * @param traverse - dresser traverse, mm/min, over 0.
 * @returns seconds, unrounded.
 * @source derived-dressing
 * @example secondsAcross(12, stated('dresser traverse', [840, 'mm/min'])).value // 1 s
 */
export function secondsAcross(widthMm: number | null, traverse: Figure): Figure {
  return figure({
    unit: 's',
    formula: '{t} = 60 ({T} + {o}) / {v_fd}',
    source: 'derived-dressing',
    terms: [
      term('T', 'wheel width', [widthMm, 'mm']),
      assumedTerm('o', 'beside the wheel at both ends', [OVERRUN_MM, 'mm']),
      termOf('v_fd', 'dresser traverse', traverse),
    ],
    compute: (width, beside, rate) =>
      rate > 0 ? (SECONDS_PER_MINUTE * (width + beside)) / rate : null,
  });
}

/**
 * The height of the thread that the diamond leaves on the wheel.
 *
 * @param depthMm - depth of dressing, mm.
 * @param overlap - overlap, 1 or more.
 * @returns height, mm, unrounded.
 * @source derived-dressing
 * @example dressCusp(0.025, 2).value // 0.00625 mm
 */
export function dressCusp(depthMm: number | null, overlap: number | null): Figure {
  return figure({
    unit: 'mm',
    formula: '{h} = {a_d} / {U_d}²',
    source: 'derived-dressing',
    terms: [
      term('a_d', 'depth of dressing', [depthMm, 'mm']),
      term('U_d', 'overlap', [overlap, '1']),
    ],
    compute: (depth, ratio) => (ratio > 0 ? depth / ratio ** 2 : null),
  });
}

/** What the dressing of a setup depends on. */
export interface DressingInput extends DressingConditions {
  dress: DressInputs;
  rules: ShopRules;
  /** Wheel diameter when new, mm. */
  diameterMm: number | null;
  widthMm: number | null;
  spindle: Figure;
}

export interface DressingPlan {
  rough: DressStage;
  finish: DressStage;
  diamond: Figure;
  findings: Finding[];
}

/**
 * Both dressings of a setup: an open wheel for roughing, a fine one for finishing, and the diamond for them.
 *
 * @param input - what was chosen, the shop's usual values, wheel and spindle speed.
 * @returns both stages and what speaks against them; figures are null while the wheel is unknown.
 * @source derived-dressing
 * @example planDressing({ dress: planInput.dress, rules, diameterMm: 25, widthMm: 12, spindle: stated('spindle speed', [15000, 'rpm']), marking: null, dry: true, wheelMPerS: 20 }).diamond.value // 0.35 ct
 */
export function planDressing(input: DressingInput): DressingPlan {
  const rough = dressStage('rough', input);
  const finish = dressStage('finish', input);
  const diamond = smallestDiamond(input.diameterMm, input.widthMm, input);
  return {
    rough,
    finish,
    diamond,
    findings: [
      ...stageFindings('rough', rough),
      ...stageFindings('finish', finish),
      ...diamondFindings(input.dress.diamondCarats, diamond),
    ],
  };
}

function dressStage(stage: Stage, input: DressingInput): DressStage {
  const { dress, rules } = input;
  const chosen =
    stage === 'rough'
      ? { depth: dress.roughDepthMm, passes: dress.roughPasses, overlap: dress.roughOverlap }
      : { depth: dress.finishDepthMm, passes: dress.finishPasses, overlap: dress.finishOverlap };
  const usual =
    stage === 'rough'
      ? {
          depthMm: rules.roughDressDepthMm,
          passes: rules.roughDressPasses,
          overlap: rules.roughDressOverlap,
        }
      : {
          depthMm: rules.finishDressDepthMm,
          passes: rules.finishDressPasses,
          overlap: rules.finishDressOverlap,
        };
  const passes = chosen.passes ?? usual.passes;
  const overlap = chosen.overlap ?? usual.overlap;
  const depth = depthFigure(usual.depthMm, chosen.depth);
  const tipRadius = dress.tipRadiusMm ?? rules.assumedTipRadiusMm;
  const lead = dressLead(dressWidth(tipRadius, depth.value, dress.tipRadiusMm === null), overlap);
  const traverseRate = dressTraverse(lead, input.spindle);
  return {
    passes,
    overlap,
    depth,
    lead,
    traverseRate,
    secondsAcross: secondsAcross(input.widthMm, traverseRate),
    wheelLoss: figure({
      unit: 'mm',
      formula: '2 {i} {a_d}',
      source: 'derived-dressing',
      terms: [
        term('i', 'dressing passes', [passes, 'passes']),
        termOf('a_d', 'depth of dressing', depth),
      ],
      compute: (count, each) => 2 * count * each,
      note: 'On diameter.',
    }),
  };
}

function depthFigure(usualMm: number, chosenMm: number | null): Figure {
  return figure({
    unit: 'mm',
    formula: '{a_d}',
    source: chosenMm === null ? 'memory-dress-depth' : 'entered',
    terms: [
      (chosenMm === null ? assumedTerm : term)('a_d', "depth on the wheel's radius", [
        chosenMm ?? usualMm,
        'mm',
      ]),
    ],
    compute: (depth) => depth,
    note: 'At most 0.025 mm (0.001 in) a pass.',
  });
}

function stageFindings(stage: Stage, { depth, overlap }: DressStage): Finding[] {
  const names = { stage };
  return [
    ...(depth.value !== null && depth.value > MOST_DEPTH_MM + SLACK
      ? [
          finding('dress-too-deep', {
            names,
            figures: {
              depth: quantity(depth.value, 'mm'),
              limit: quantity(MOST_DEPTH_MM, 'mm'),
            },
          }),
        ]
      : []),
    ...(overlap < LEAST_OVERLAP - SLACK
      ? [finding('dress-overlap-low', { names, figures: { overlap: quantity(overlap, '1') } })]
      : []),
  ];
}

function diamondFindings(carats: number | null, smallest: Figure): Finding[] {
  if (carats === null || smallest.value === null || carats >= smallest.value - SLACK) return [];
  return [
    finding('diamond-small', {
      figures: { carats: quantity(carats, 'ct'), usual: quantity(smallest.value, 'ct') },
    }),
  ];
}
