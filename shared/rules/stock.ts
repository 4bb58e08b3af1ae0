import type { PlanInput } from '../domain/setups';
import { toRadians } from './angles';
import { coneOf } from './cone';
import { finding } from './findings';
import { assumedTerm, figure, quantity, term, termOf } from './figures';
import { bellMouth, planJaws } from './jaws';
import { offsetFromRunOut, offsetLine } from './offset';
import { notNegative, positive } from './sizes';
import { surfaceOf, type Surface } from './surface';
import type { Figure, Finding, JawPlan } from './types';

/** Where a chuck's pads begin: distances are measured from the chuck's face. */
const PAD_BACK_MM = 0;

/**
 * The order in which the jaws touch, from run-out and high spot at two distances.
 *
 * @param input - the setup; only its work is read.
 * @returns null while the operation is another, or something is missing.
 * @source derived-jaw-contact
 * @example jawPlanOf(planInput)?.contacts[0]?.order // 2
 */
export function jawPlanOf(input: Pick<PlanInput, 'operation' | 'work'>): JawPlan | null {
  const { work } = input;
  const { diameterMm, lengthMm } = surfaceOf(input);
  const padWidthMm = positive(work.padWidthMm);
  const planes = [
    plane(work.nearDistanceMm, work.nearRunOutMm, work.nearHighSpotDeg),
    plane(work.farDistanceMm, work.farRunOutMm, work.farHighSpotDeg),
  ].flatMap((known) => (known === null ? [] : [known]));
  if (input.operation !== 'jaws' || planes.length < 2) return null;
  if (diameterMm === null || lengthMm === null || padWidthMm === null || work.jawCount === null)
    return null;
  const offset = offsetLine(planes);
  return offset === null
    ? null
    : planJaws({
        jawCount: work.jawCount,
        boreMm: diameterMm,
        padWidthMm,
        padBackMm: PAD_BACK_MM,
        padFrontMm: PAD_BACK_MM + lengthMm,
        lastGroundMm: positive(work.lastGroundDiameterMm),
        offset,
        padErrors: bellMouth(work.jawCount, notNegative(work.bellMouthMm) ?? 0),
      });
}

/** High spots do not matter where there is no run-out. */
function plane(distance: number | null, runOut: number | null, highSpot: number | null) {
  const zMm = notNegative(distance);
  const runOutMm = notNegative(runOut);
  const angle = runOutMm === 0 ? 0 : highSpot;
  return zMm === null || runOutMm === null || angle === null
    ? null
    : { zMm, ...offsetFromRunOut(runOutMm, angle) };
}

/**
 * Metal to take off, on radius: for jaws what cleans all of them and a little more, for round work half of the
 * stock on diameter.
 *
 * @param input - the setup.
 * @param jaws - the jaws' plan, null for round work or while unknown.
 * @returns mm on radius, unrounded.
 * @source practice-jaw-clean-up
 * @example stockOf(planInput, jawPlanOf(planInput)).value // 0.1232 mm
 */
export function stockOf(input: PlanInput, jaws: JawPlan | null): Figure {
  const { operation, work } = input;
  if (operation === 'taper' && work.taperMethod === 'tailstock')
    return figure({
      unit: 'mm',
      formula: '{z} cos {α} / 2',
      source: 'derived-taper',
      terms: [
        term('z', 'stock on diameter', [positive(work.stockOnDiameterMm), 'mm']),
        termOf('α', 'half angle', coneOf(work).half),
      ],
      compute: (onDiameter, half) => (onDiameter * Math.cos(toRadians(half))) / 2,
      note: 'Square to the surface: with the tailstock set over it lies along the bed.',
    });
  if (operation !== 'jaws')
    return figure({
      unit: 'mm',
      formula: '{z} / 2',
      source: 'entered',
      terms: [term('z', 'stock on diameter', [positive(work.stockOnDiameterMm), 'mm'])],
      compute: (onDiameter) => onDiameter / 2,
    });
  const cleanUp: Figure =
    jaws?.cleanUp ??
    figure({
      unit: 'mm',
      formula: '{r_last} - {r_first}',
      source: 'derived-jaw-contact',
      terms: [term('r', 'wheel path', [null, 'mm'])],
      compute: () => null,
    });
  return figure({
    unit: 'mm',
    formula: '{c} + {x}',
    source: 'practice-jaw-clean-up',
    terms: [
      termOf('c', 'infeed from the first touch until every pad is clean', cleanUp),
      assumedTerm('x', 'taken beyond clean-up', [input.rules.jawAllowanceMm, 'mm']),
    ],
    compute: (clean, beyond) => clean + beyond,
  });
}

/**
 * Round work cleans up when its stock on diameter is at least the run-out in the worst plane.
 *
 * @param input - the setup.
 * @returns a Check with the shortfall, or nothing.
 */
export function stockFindings({ operation, work }: PlanInput): Finding[] {
  const stock = positive(work.stockOnDiameterMm);
  const runOut = notNegative(work.runOutMm);
  if (operation === 'jaws' || stock === null || runOut === null || stock >= runOut - 1e-9)
    return [];
  return [
    finding('clean-up-short', {
      figures: { shortfall: quantity(runOut - stock, 'mm'), runOut: quantity(runOut, 'mm') },
    }),
  ];
}

/**
 * At a shoulder the wheel cannot run past the end of the surface.
 *
 * @param surface - the ground surface.
 * @returns a note where there is a shoulder.
 */
export function shoulderFindings({ shoulders }: Surface): Finding[] {
  return shoulders === 0 ? [] : [finding('shoulder')];
}
