import type { LatheData } from '../domain/machines';
import type { PlanInput } from '../domain/setups';
import { toRadians } from './angles';
import { compoundReading, crankRate, handFedWorkSpeed, slantTravel } from './compound';
import { finding } from './findings';
import { figure, finite, quantity, stated, termOf } from './figures';
import { positive } from './sizes';
import type { Surface } from './surface';
import { tailstockSetover, taperPerLength } from './taper';
import type { Figure, Finding, TaperPlan } from './types';

/** One turn a second is what a hand keeps up; half as much again is hurried (common practice). */
const HURRIED_TURNS_PER_S = 1.5;

/**
 * How the slides are set for a taper, and what speaks against it.
 *
 * @param input - the setup.
 * @param from - the ground surface, overrun, rough traverse and lathe speed.
 * @returns the taper's figures and findings; null and none for other work.
 * @source derived-taper
 * @example planTaper(planInput, { surface: surfaceOf(planInput), overrun: plan.traverse.overrun, traverse: plan.traverse.rough, latheRpm: plan.work.latheRpm }).taper // null
 */
export function planTaper(
  { work, lathe }: Pick<PlanInput, 'work' | 'lathe'>,
  from: { surface: Surface; overrun: Figure; traverse: Figure; latheRpm: Figure },
): { taper: TaperPlan | null; findings: Finding[] } {
  const { surface } = from;
  const { cone } = surface;
  if (cone === null) return { taper: null, findings: [] };
  const { half } = cone;
  const perLength = taperPerLength(half);
  const compound = surface.slide === 'compound';
  const taper: TaperPlan = {
    method: work.taperMethod,
    halfAngle: half,
    includedAngle: figure({
      unit: 'deg',
      formula: '{β} = 2 {α}',
      source: 'derived-taper',
      terms: [termOf('α', 'half angle', half)],
      compute: (angle) => 2 * angle,
    }),
    perLength,
    smallDiameter: cone.smallDiameter,
    slantLength: cone.slantLength,
    depthPerInfeed: depthFigure(surface),
    compound: compound
      ? {
          zero: lathe?.compoundZero ?? null,
          fromCrossSlide: compoundReading(half, 'cross-slide'),
          fromSpindleAxis: compoundReading(half, 'spindle-axis'),
          travel: slantTravel(positive(work.lengthMm), half, from.overrun.value),
          crankRate: crankRate(from.traverse, from.latheRpm, lathe?.compoundMmPerTurn ?? null),
          handFedSpeed: handFedWorkSpeed(
            lathe?.compoundMmPerTurn ?? null,
            from.traverse.value,
            surface.diameterMm,
          ),
        }
      : null,
    setover: compound ? null : tailstockSetover(positive(work.unsupportedLengthMm), perLength),
  };
  return {
    taper,
    findings: [
      ...coneFindings(surface, work),
      ...(compound ? compoundFindings(taper, lathe) : setoverFindings(work)),
    ],
  };
}

function depthFigure({ slide, cone }: Surface): Figure {
  const half = cone?.half ?? stated('half angle', [null, 'deg']);
  return slide === 'carriage'
    ? stated('share of the cross-slide’s move that cuts', [1, '1'], 'derived-taper')
    : figure({
        unit: '1',
        formula: 'cos {α}',
        source: 'derived-taper',
        terms: [termOf('α', 'half angle', half)],
        compute: (angle) => Math.cos(toRadians(angle)),
        note: 'Depth of cut, square to the surface, for each millimetre at the cross-slide.',
      });
}

function coneFindings({ cone, diameterMm }: Surface, work: PlanInput['work']): Finding[] {
  const small = cone?.smallDiameter.value ?? null;
  const typedSmall = work.taperGiven === 'small end' ? finite(work.smallDiameterMm) : null;
  if (typedSmall !== null && diameterMm !== null && typedSmall >= diameterMm)
    return [
      finding('taper-ends-swapped', {
        figures: { small: quantity(typedSmall, 'mm'), large: quantity(diameterMm, 'mm') },
      }),
    ];
  const half = cone?.half.value ?? null;
  if (small === null || small >= -1e-9 || diameterMm === null || half === null) return [];
  return [
    finding('cone-past-its-point', {
      figures: { longest: quantity(diameterMm / (2 * Math.tan(toRadians(half))), 'mm') },
    }),
  ];
}

function compoundFindings({ compound }: TaperPlan, lathe: LatheData | null): Finding[] {
  if (compound === null || lathe === null) return [];
  const found: Finding[] = [];
  const travel = positive(lathe.compoundTravelMm);
  const needed = compound.travel.value;
  if (lathe.compoundZero === null) found.push(finding('compound-zero-unknown'));
  if (travel === null) found.push(finding('compound-travel-unknown'));
  else if (needed !== null && needed > travel + 1e-9)
    found.push(
      finding('taper-too-long', {
        figures: { needed: quantity(needed, 'mm'), travel: quantity(travel, 'mm') },
      }),
    );
  const turns = compound.crankRate.value;
  if (turns !== null && turns > HURRIED_TURNS_PER_S)
    found.push(finding('crank-hurried', { figures: { turns: quantity(turns, '1') } }));
  return found;
}

function setoverFindings(work: PlanInput['work']): Finding[] {
  if (work.taperSide === 'inside') return [finding('setover-inside')];
  return work.holding !== null && work.holding !== 'centres'
    ? [finding('setover-needs-centres')]
    : [];
}
