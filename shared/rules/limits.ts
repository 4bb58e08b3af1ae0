import type { GrinderData, QuillData } from '../domain/machines';
import type { ShopRules } from '../domain/shop-rules';
import type { MountedWheel, WheelData } from '../domain/wheels';
import { figure, floorTo, stated, term } from './figures';
import { firstFrequency, wheelMassKg } from './quill';
import type { Figure, SpeedLimit } from './types';

type Marking = Pick<WheelData, 'markedRpm' | 'markedSpeedMPerS' | 'diameterNewMm'>;

const PROPORTIONAL =
  'Some laws let a worn wheel turn faster in proportion, up to the marked speed; here the marked rpm stays.';

/** The rpm marked on the wheel; a worn wheel keeps it. */
function markedRpmLimit(rpm: number): Figure {
  return figure({
    unit: 'rpm',
    formula: '{n}',
    source: 'osha-1910-215-d1',
    terms: [term('n', 'marked on the wheel', [rpm, 'rpm'])],
    compute: (n) => floorTo(n, 1),
    note: PROPORTIONAL,
  });
}

/**
 * The rpm that a marked speed allows, always with the diameter when new.
 *
 * @param speedMPerS - speed marked on the wheel, m/s, over 0.
 * @param diameterNewMm - wheel diameter when new, mm, over 0.
 * @returns whole rpm, rounded down; null while an argument is.
 * @source cal-t8-3580
 * @example rpmOfMarkedSpeed(25, 32).value // 14920
 */
export function rpmOfMarkedSpeed(speedMPerS: number | null, diameterNewMm: number | null): Figure {
  return figure({
    unit: 'rpm',
    formula: '{n} = 60 000 {v} / (π {D_new})',
    source: 'cal-t8-3580',
    terms: [
      term('v', 'marked on the wheel', [speedMPerS, 'm/s']),
      term('D_new', 'wheel diameter when new', [diameterNewMm, 'mm']),
    ],
    compute: (v, d) => floorTo((60_000 * v) / (Math.PI * d), 1),
    note: PROPORTIONAL,
  });
}

function mountedLimit(mounted: MountedWheel): Figure {
  const entered = mounted.makerMaximumRpm;
  return figure({
    unit: 'rpm',
    formula: entered === null ? '0' : '{n}',
    source: 'ansi-b7-1-2000-10-1',
    terms:
      entered === null ? [] : [term('n', "maker's figure for this overhang", [entered, 'rpm'])],
    compute: (n) => (entered === null ? 0 : floorTo(n ?? 0, 1)),
    note: mounted.threaded
      ? 'Threaded mandrel: the figure for half an inch of overhang of an unthreaded one.'
      : 'The figure for this shape, mandrel, overhang and specification.',
  });
}

/**
 * Every limit that the wheel itself sets.
 *
 * @param wheel - marked rpm and m/s, diameter when new in mm, and whether the wheel is mounted on a mandrel.
 * @returns limits in whole rpm, rounded down; one of 0 when nothing is marked.
 * @source osha-1910-215-d1
 * @example wheelLimits({ markedRpm: null, markedSpeedMPerS: null, diameterNewMm: 25, mounted: null })[0]?.rpm.value // 0
 */
export function wheelLimits(wheel: Marking & Pick<WheelData, 'mounted'>): SpeedLimit[] {
  const limits: SpeedLimit[] = [];
  if (wheel.markedRpm !== null)
    limits.push({ kind: 'marked rpm', rpm: markedRpmLimit(wheel.markedRpm) });
  if (wheel.markedSpeedMPerS !== null)
    limits.push({
      kind: 'marked speed',
      rpm: rpmOfMarkedSpeed(wheel.markedSpeedMPerS, wheel.diameterNewMm),
    });
  if (wheel.mounted !== null)
    limits.push({ kind: 'maker, mounted', rpm: mountedLimit(wheel.mounted) });
  if (limits.length === 0)
    limits.push({
      kind: 'unmarked',
      rpm: figure({
        unit: 'rpm',
        formula: '0',
        source: 'osha-1910-215-d1',
        terms: [],
        compute: () => 0,
        note: 'Neither rpm nor m/s is marked: the wheel must not run.',
      }),
    });
  return limits;
}

/** Limits of the quill: what is marked on it, and a share of its first bending frequency. */
function quillLimits(
  quill: QuillData | null,
  wheel: WheelData | null,
  rules: ShopRules,
): SpeedLimit[] {
  if (quill === null) return [];
  const limits: SpeedLimit[] = [];
  if (quill.markedMaximumRpm !== null)
    limits.push({
      kind: 'quill marked',
      rpm: stated('marked on the quill', [floorTo(quill.markedMaximumRpm, 1), 'rpm']),
    });
  const frequency = firstFrequency(quill, wheel === null ? null : wheelMassKg(wheel));
  const measured = quill.measuredFrequencyHz !== null;
  const share = measured ? rules.measuredFrequencyShare : rules.computedFrequencyShare;
  if (frequency.value !== null)
    limits.push({
      kind: 'quill bending',
      rpm: figure({
        unit: 'rpm',
        formula: '{n} = {c} · 60 {f_1}',
        source: 'memory-quill-share',
        terms: [
          { ...term('c', 'share of the first bending frequency', [share, '1']), assumed: true },
          term('f_1', `first bending frequency, ${measured ? 'measured' : 'computed'}`, [
            frequency.value,
            'Hz',
          ]),
        ],
        compute: (c, f) => floorTo(c * 60 * f, 1),
      }),
    });
  return limits;
}

/**
 * Every limit in force on the spindle, lowest first.
 *
 * @param parts - wheel, quill and grinder, each null while unknown, and the shop's rules.
 * @returns limits in whole rpm, rounded down.
 * @source miosha-408-10174
 * @example speedLimits({ wheel, quill, grinder, rules })[0]?.kind // 'marked rpm'
 */
export function speedLimits(parts: {
  wheel: WheelData | null;
  quill: QuillData | null;
  grinder: GrinderData | null;
  rules: ShopRules;
}): SpeedLimit[] {
  const { wheel, quill, grinder, rules } = parts;
  const limits = [
    ...(wheel === null ? [] : wheelLimits(wheel)),
    ...quillLimits(quill, wheel, rules),
  ];
  if (grinder !== null && grinder.spindleMaximumRpm !== null)
    limits.push({
      kind: 'grinder spindle',
      rpm: stated("stated for the grinder's spindle", [
        floorTo(grinder.spindleMaximumRpm, 1),
        'rpm',
      ]),
    });
  return limits.sort((a, b) => limitRpm(a) - limitRpm(b));
}

/**
 * What a limit allows, rpm; 0 where it could not be worked out, since unknown means stop.
 *
 * @param limit - one limit.
 * @returns whole rpm.
 */
export function limitRpm(limit: SpeedLimit): number {
  return limit.rpm.value ?? 0;
}
