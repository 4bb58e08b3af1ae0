import type { ShopRules } from '../domain/shop-rules';
import { CAUTIONS } from './cautions';
import { FINDINGS } from './findings';
import { SHOP_SETTINGS, type ShopSetting } from './shop-settings';
import type { SourceId } from './sources';

/** The figures whose working names a source, in the words of a plan. */
const FIGURES: Partial<Record<SourceId, readonly string[]>> = {
  'osha-1910-215-d1': ['limit from the marked rpm', 'an unmarked wheel’s limit of nothing'],
  'cal-t8-3580': ['limit from the marked speed'],
  'wac-296-806-40516': ['least flange'],
  'ansi-b7-1-2000-10-1': ['limit of a mounted wheel'],
  'iso-1101': ['run-out of a survey', 'offset from a run-out'],
  'iso-12181': ['out of round'],
  'mh31-1303': ['smallest diamond'],
  'mh31-1317': ['recommended markings', 'how well a wheel suits the work'],
  'mh31-1318': ['work speed aimed at', 'lathe step', 'infeed', 'traverse'],
  'modern-grinding-dressing': ['lead of dressing', 'dresser traverse'],
  lautard: ['angle of the compound slide for tenths'],
  'jones-setover': ['setover of the tailstock'],
  'groover-24': ['wheel speed', 'work speed', 'length of contact', 'metal removed'],
  'khurmi-33': ['spindle speed to expect from the pulleys'],
  'kalpakjian-energy': ['specific energy'],
  'kalpakjian-force': ['power', 'force along the rim'],
  'derived-geometry': ['overrun of a plunge'],
  'derived-worst-rpm': ['spindle speed held against the limits'],
  'derived-least-squares': ['eccentricity', 'its uncertainty', 'tilt'],
  'derived-jaw-contact': ['order in which jaws touch', 'clean-up stock of jaws'],
  'derived-round-clean-up': ['clean-up stock of round work'],
  'derived-contact-length': ['equivalent diameter', 'metal removed in a plunge'],
  'derived-wheel-wear': ['wheel wear in a pass'],
  'derived-dressing': ['width of the diamond’s groove', 'seconds across', 'wheel lost in dressing'],
  'derived-spring': ['cut fraction', 'lag', 'spark-out passes', 'stiffness at the wheel'],
  'derived-beam': ['stiffness and first frequency of a quill', 'stiffness of the work'],
  'derived-taper': ['half angle', 'taper', 'moves on a cone', 'tailstock correction'],
  'derived-centre-height': ['diameter ground off centre height', 'infeed gain'],
  'derived-time': ['time', 'seconds for a stroke'],
  'practice-overrun': ['overrun', 'travel'],
  'practice-dial': ['infeed in whole or half divisions'],
  'practice-scale': ['reading of the compound’s scale'],
  'practice-crank': ['work speed for hand feed'],
  'practice-jaw-clean-up': ['stock of jaws'],
  'memory-quill-share': ['limit from the quill’s bending'],
  'memory-materials': ['work speed of cast iron and stainless'],
  'memory-speed-ratio': ['speed ratio'],
  'memory-traverse-share': ['traverse on a tool-post grinder'],
  'memory-post-stiffness': ['stiffness of post and slides'],
  'memory-force-ratio': ['normal force'],
  'memory-chip-thickness': ['equivalent chip thickness', 'specific removal'],
  'memory-dress-depth': ['depth and passes of dressing'],
  'memory-expansion': ['shrinkage while cooling'],
  'memory-energy-assumed': ['specific energy of materials without a row'],
  'malkin-burn': ['burning threshold'],
  entered: ['what was measured or chosen'],
};

/** A shop setting that starts at the source's value. */
export interface RestingSetting extends ShopSetting {
  key: keyof ShopRules;
}

export interface Resting {
  figures: readonly string[];
  /** Titles of findings, with `{key}` where a figure or a name is set. */
  findings: string[];
  cautions: string[];
  settings: RestingSetting[];
}

/**
 * What of the product rests on a source: figures, findings, cautions, and shop settings that start at its value.
 *
 * @param source - id in the registry.
 * @returns the words of each; empty lists where nothing does.
 * @source none: it only reads the catalogues
 * @example restsOn('mh31-1303').figures // ['smallest diamond']
 */
export function restsOn(source: SourceId): Resting {
  const titles = Object.values(FINDINGS).filter((entry) => entry.source === source);
  const posted = Object.values(CAUTIONS).filter((caution) => caution.source === source);
  const keys = Object.keys(SHOP_SETTINGS) as (keyof ShopRules)[]; // Object.keys forgets the key type
  return {
    figures: FIGURES[source] ?? [],
    findings: titles.map(({ title }) => title),
    cautions: posted.map(({ words }) => words),
    settings: keys
      .map((key) => ({ ...SHOP_SETTINGS[key], key }))
      .filter((setting) => setting.source === source),
  };
}
