import { equivalentChip, specificRemoval } from './contact';
import { burnFindings, burnThreshold } from './energy';
import { finding } from './findings';
import { quantity } from './figures';
import { grindingPower, normalForce, tangentialForce } from './force';
import type { Surface } from './surface';
import type { Figure, Finding, Plan } from './types';

export interface CuttingForce {
  removal: Figure;
  power: Figure;
  tangential: Figure;
  normal: Figure;
}

/** What the forces of a cut are worked out from. */
export interface CutLoad {
  surface: Surface;
  energy: Figure;
  wheelSpeed: Figure;
  forceRatio: number;
}

/**
 * Metal removed, power and forces of one stage in its steady state.
 *
 * @param load - surface, specific energy, wheel speed and force ratio.
 * @param removal - metal removed, mm3/s.
 * @returns the figures; null while something they need is missing.
 * @source kalpakjian-force
 * @example cuttingForce({ surface: surfaceOf(planInput), energy: specificEnergy('tool-hardened'), wheelSpeed: wheelSpeed(27, 15000), forceRatio: 0.4 }, stated('removal', [1, 'mm3/s'])).normal.value // 4.53 N
 */
export function cuttingForce(load: CutLoad, removal: Figure): CuttingForce {
  const power = grindingPower(load.energy, removal);
  const tangential = tangentialForce(power, load.wheelSpeed);
  return { removal, power, tangential, normal: normalForce(tangential, load.forceRatio) };
}

/**
 * Force, power and heat of the rough stage, and what speaks against them.
 *
 * @param spec - the load, equivalent diameter, metal removed, infeed on radius in mm, work speed in m/min,
 * motor power in W and the share of it that may be used, and whether the work is steel.
 * @returns figures and findings.
 * @source malkin-burn
 * @example planPower({ load: { surface: surfaceOf(planInput), energy: specificEnergy('tool-hardened'), wheelSpeed: wheelSpeed(27, 15000), forceRatio: 0.4 }, contact: equivalentDiameter(27, 40, 'inside'), removal: stated('removal', [1, 'mm3/s']), infeedMm: 0.005, workMPerMin: 15, motorW: 370, share: 0.8, steel: true }).findings // []
 */
export function planPower(spec: {
  load: CutLoad;
  contact: Figure;
  removal: Figure;
  infeedMm: number | null;
  workMPerMin: number | null;
  motorW: number | null;
  share: number;
  steel: boolean;
}): { power: Plan['power']; findings: Finding[] } {
  const { load, infeedMm } = spec;
  const force = cuttingForce(load, spec.removal);
  const threshold = burnThreshold(spec.contact, infeedMm, spec.workMPerMin);
  return {
    power: {
      removalRate: force.removal,
      tangentialForce: force.tangential,
      normalForce: force.normal,
      power: force.power,
      burnThreshold: threshold,
      chipThickness: equivalentChip(infeedMm, spec.workMPerMin, load.wheelSpeed.value),
      specificRemoval: specificRemoval(infeedMm, spec.workMPerMin),
    },
    findings: [
      ...powerFindings(force.power.value, spec.motorW === null ? null : spec.motorW * spec.share),
      ...(spec.steel ? burnFindings(load.energy, threshold, infeedMm) : []),
    ],
  };
}

function powerFindings(watts: number | null, availableW: number | null): Finding[] {
  if (watts === null || availableW === null || watts <= availableW + 1e-9) return [];
  return [
    finding('power-above-share', {
      figures: { power: quantity(watts, 'W'), limit: quantity(availableW, 'W') },
    }),
  ];
}
