import { toRadians } from './angles';
import { figure, term, termOf } from './figures';
import { eccentricity, highSpot, type Offset } from './offset';
import type { Figure } from './types';

/** One indicator reading. It rises as the surface stands further from the axis; negate readings taken in a bore. */
export interface Reading {
  angleDeg: number;
  readingMm: number;
}

export interface RunoutFit extends Offset {
  /** Mean reading, R_0. */
  meanMm: number;
  /** Angle of the high spot, 0 to 360. */
  highSpotDeg: number;
  /** Reading less the fitted circle, in the order of the readings. */
  residualsMm: number[];
  eccentricity: Figure;
  /** Standard uncertainty of the eccentricity; null value with fewer than four readings. */
  uncertainty: Figure;
  /** Range of the residuals; null value with fewer than four readings, which leave none. */
  outOfRound: Figure;
  /** Highest less lowest reading. */
  runOut: Figure;
  /** Run-out of the fitted circle alone: what is left when the surface itself is taken for round. */
  circleRunOut: Figure;
  /** The high spot, with its working. */
  highSpot: Figure;
}

const FITTED_VALUES = 3;
/** Readings so bunched that the fit would only magnify their errors; the best spread gives 0.25. */
const LEAST_SPREAD = 1e-6;

/**
 * What indicator readings around a part say: how far off centre it is, which way, and how far from round.
 *
 * Fits the least-squares circle at whatever angles were read. Three readings always fit, so only a fourth
 * shows how far the part is from round.
 *
 * @param readings - angle in degrees in the direction of counting, reading in mm; three or more.
 * @returns the fit, unrounded; null with fewer than three readings or when they are bunched together.
 * @source derived-least-squares
 * @example fitRunout([{ angleDeg: 0, readingMm: 0.1 }, { angleDeg: 90, readingMm: 0.05 }, { angleDeg: 180, readingMm: 0 }, { angleDeg: 270, readingMm: 0.05 }])?.eccentricity.value // 0.05 mm
 */
export function fitRunout(readings: readonly Reading[]): RunoutFit | null {
  const count = readings.length;
  if (count < FITTED_VALUES) return null;
  const points = readings.map(({ angleDeg, readingMm }) => ({
    cos: Math.cos(toRadians(angleDeg)),
    sin: Math.sin(toRadians(angleDeg)),
    reading: readingMm,
  }));
  const mean = (pick: (point: (typeof points)[number]) => number) =>
    points.reduce((sum, point) => sum + pick(point), 0) / count;
  const [meanCos, meanSin, meanReading] = [
    mean((p) => p.cos),
    mean((p) => p.sin),
    mean((p) => p.reading),
  ];
  const cc = mean((p) => (p.cos - meanCos) ** 2);
  const ss = mean((p) => (p.sin - meanSin) ** 2);
  const cs = mean((p) => (p.cos - meanCos) * (p.sin - meanSin));
  const cr = mean((p) => (p.cos - meanCos) * (p.reading - meanReading));
  const sr = mean((p) => (p.sin - meanSin) * (p.reading - meanReading));
  const spread = cc * ss - cs * cs;
  if (!(spread > LEAST_SPREAD)) return null;

  const aMm = (cr * ss - sr * cs) / spread;
  const bMm = (sr * cc - cr * cs) / spread;
  const meanMm = meanReading - aMm * meanCos - bMm * meanSin;
  const residualsMm = points.map((p) => p.reading - meanMm - aMm * p.cos - bMm * p.sin);
  const high = highSpot({ aMm, bMm });
  const [alongCos, alongSin] = [Math.cos(toRadians(high)), Math.sin(toRadians(high))];
  const variance =
    (alongCos ** 2 * ss - 2 * alongCos * alongSin * cs + alongSin ** 2 * cc) / (spread * count);
  const offCentre = eccentricity({ aMm, bMm });
  return {
    aMm,
    bMm,
    meanMm,
    highSpotDeg: high,
    residualsMm,
    eccentricity: offCentre,
    uncertainty: uncertainty(residualsMm, variance),
    outOfRound: outOfRound(residualsMm),
    runOut: runOut(readings),
    circleRunOut: runOutOfOffset(offCentre),
    highSpot: highSpotFigure({ aMm, bMm }),
  };
}

/**
 * The stock on diameter that round work needs to clean up all round.
 *
 * @param runOutMm - run-out (TIR) in the worst plane, mm, 0 or more.
 * @param formErrorMm - how far the surface itself is from round, mm; 0 where the run-out was read on it.
 * @returns least stock on diameter, mm, unrounded.
 * @source derived-round-clean-up
 * @example cleanUpStock(0.08, 0.01).value // 0.09 mm
 */
export function cleanUpStock(runOutMm: number | null, formErrorMm: number): Figure {
  return figure({
    unit: 'mm',
    formula: '{s} = {TIR} + {f}',
    source: 'derived-round-clean-up',
    terms: [
      term('TIR', 'run-out in the worst plane', [runOutMm, 'mm']),
      term('f', 'error of form', [formErrorMm, 'mm']),
    ],
    compute: (runOutRead, form) => runOutRead + form,
  });
}

/**
 * The run-out of a round surface that stands off centre: the indicator goes out and back in by its eccentricity.
 *
 * @param offCentre - eccentricity, mm, 0 or more.
 * @returns run-out (TIR), mm.
 * @source iso-1101
 * @example runOutOfOffset(eccentricity({ aMm: 0.03, bMm: 0.04 })).value // 0.1 mm
 */
export function runOutOfOffset(offCentre: Figure): Figure {
  return figure({
    unit: 'mm',
    formula: '{TIR} = 2 {e}',
    source: 'iso-1101',
    terms: [termOf('e', 'eccentricity of the fitted circle', offCentre)],
    compute: (off) => 2 * off,
  });
}

function highSpotFigure(offset: Offset): Figure {
  return figure({
    unit: 'deg',
    formula: '{φ} = atan2({b}, {a})',
    source: 'derived-least-squares',
    terms: [
      term('b', 'offset along 90 degrees', [offset.bMm, 'mm']),
      term('a', 'offset along 0 degrees', [offset.aMm, 'mm']),
    ],
    compute: (bMm, aMm) => highSpot({ aMm, bMm }),
    note: 'Counted from where the angles start, 0 to 360 degrees.',
  });
}

function runOut(readings: readonly Reading[]): Figure {
  const values = readings.map(({ readingMm }) => readingMm);
  return figure({
    unit: 'mm',
    formula: '{TIR} = {h} - {l}',
    source: 'iso-1101',
    terms: [
      term('h', 'highest reading', [Math.max(...values), 'mm']),
      term('l', 'lowest reading', [Math.min(...values), 'mm']),
    ],
    compute: (highest, lowest) => highest - lowest,
  });
}

function outOfRound(residualsMm: readonly number[]): Figure {
  const enough = residualsMm.length > FITTED_VALUES;
  return figure({
    unit: 'mm',
    formula: '{f} = {p} - {v}',
    source: 'iso-12181',
    terms: [
      term('p', 'furthest outside the circle', [enough ? Math.max(...residualsMm) : null, 'mm']),
      term('v', 'furthest inside the circle', [enough ? Math.min(...residualsMm) : null, 'mm']),
    ],
    compute: (peak, valley) => peak - valley,
    note: enough
      ? undefined
      : 'Three readings always lie on a circle: take four or more to see how round it is.',
  });
}

function uncertainty(residualsMm: readonly number[], variance: number): Figure {
  const spare = residualsMm.length - FITTED_VALUES;
  const sum = residualsMm.reduce((total, residual) => total + residual ** 2, 0);
  return figure({
    unit: 'mm',
    formula: '{u} = {s} √{q}',
    source: 'derived-least-squares',
    terms: [
      term('s', 'scatter of the readings about the circle', [
        spare > 0 ? Math.sqrt(sum / spare) : null,
        'mm',
      ]),
      term('q', 'share of it that reaches the eccentricity', [variance, '1']),
    ],
    compute: (scatter, share) => scatter * Math.sqrt(share),
    note: spare > 0 ? undefined : 'Fewer than four readings leave nothing over to judge this by.',
  });
}
