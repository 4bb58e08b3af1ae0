import { equivalentDiameter, removalRate } from './contact';
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

/** What one stage's cut is worked out from. */
export interface StageLoad {
  surface: Surface;
  energy: Figure;
  wheelSpeed: Figure;
  forceRatio: number;
}

/**
 * Metal removed, power and forces of one stage in its steady state.
 *
 * @param load - surface, specific energy, wheel speed and force ratio.
 * @param infeedMm - infeed on radius, mm.
 * @param rate - traverse, mm/min.
 * @returns the figures; null while something they need is missing.
 * @source kalpakjian-force
 * @example cuttingForce(load, 0.01, rate).normal.value
 */
export function cuttingForce(load: StageLoad, infeedMm: number | null, rate: Figure): CuttingForce {
  const removal = removalRate(load.surface.diameterMm, infeedMm, rate.value);
  const power = grindingPower(load.energy, removal);
  const tangential = tangentialForce(power, load.wheelSpeed);
  return { removal, power, tangential, normal: normalForce(tangential, load.forceRatio) };
}

/**
 * Force, power and heat of the rough stage, and what speaks against them.
 *
 * @param spec - the stage's load and force, infeed on radius in mm, wheel diameter in mm, work speed in m/min,
 * the power available in W, and whether the burning threshold holds for the material.
 * @returns figures and findings.
 * @source malkin-burn
 * @example planPower(spec).findings
 */
export function planPower(spec: {
  load: StageLoad;
  force: CuttingForce;
  infeedMm: number | null;
  wheelMm: number | null;
  workMPerMin: number | null;
  availableW: number | null;
  steel: boolean;
}): { power: Plan['power']; findings: Finding[] } {
  const { load, force, infeedMm, availableW } = spec;
  const contact = equivalentDiameter(spec.wheelMm, load.surface.diameterMm, load.surface.side);
  const threshold = burnThreshold(contact, infeedMm, spec.workMPerMin);
  const watts = force.power.value;
  return {
    power: {
      removalRate: force.removal,
      tangentialForce: force.tangential,
      normalForce: force.normal,
      power: force.power,
      burnThreshold: threshold,
    },
    findings: [
      ...(watts !== null && availableW !== null && watts > availableW + 1e-9
        ? [
            finding('power-above-share', {
              figures: { power: quantity(watts, 'W'), limit: quantity(availableW, 'W') },
            }),
          ]
        : []),
      ...(spec.steel ? burnFindings(load.energy, threshold, infeedMm) : []),
    ],
  };
}
