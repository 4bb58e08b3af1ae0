import type { Material } from '../domain/materials';
import { finding } from './findings';
import { parseMarking, type ConventionalBond, type WheelMarking } from './marking';
import type { Finding } from './types';

const ORGANIC: readonly ConventionalBond[] = ['E', 'R', 'RF', 'B', 'BF', 'PL'];
const FERROUS_EXCEPT: readonly Material[] = ['copper-alloy', 'aluminium-alloy'];
/** Materials for which the handbook lists silicon carbide. */
const FOR_SILICON_CARBIDE: readonly Material[] = ['cast-iron', 'copper-alloy'];

/** The marking as read; null where there is none, or it does not read. */
export function markingOf(text: string | null): WheelMarking | null {
  const parsed = text === null ? null : parseMarking(text);
  return parsed?.ok === true ? parsed.marking : null;
}

/**
 * Whether a wheel's bond is of rubber, resin, shellac or plastic, which do not ring as vitrified ones do.
 *
 * @param marking - the wheel's marking; null while unknown.
 * @returns null where the marking does not tell.
 * @source iso-525
 * @example isOrganic(markingOf('A 60 K 8 B')) // true
 */
export function isOrganic(marking: WheelMarking | null): boolean | null {
  if (marking === null) return null;
  return marking.kind === 'conventional' ? ORGANIC.includes(marking.bond) : marking.bond === 'B';
}

/**
 * Whether the wheel's abrasive belongs to the work: no diamond on steel or iron, silicon carbide for cast iron
 * and brass, aluminium oxide for the rest.
 *
 * @param text - the marking as written; null where nothing is legible.
 * @param material - the work's material; null while unknown.
 * @returns findings.
 * @source mh31-1317
 * @example abrasiveFindings('D126 R100 B', 'tool-hardened') // diamond-on-steel
 */
export function abrasiveFindings(text: string | null, material: Material | null): Finding[] {
  if (text === null) return [];
  const marking = markingOf(text);
  if (marking === null) return [finding('marking-not-read', { names: { marking: text } })];
  if (material === null) return [];
  const ferrous = !FERROUS_EXCEPT.includes(material);
  if (marking.kind === 'superabrasive')
    return marking.abrasive === 'D' && ferrous ? [finding('diamond-on-steel')] : [];
  const carbide = marking.abrasive === 'C' || marking.abrasive === 'GC';
  const wanted = FOR_SILICON_CARBIDE.includes(material);
  const name = (isCarbide: boolean) => (isCarbide ? 'silicon carbide' : 'aluminium oxide');
  return carbide === wanted
    ? []
    : [finding('abrasive-other', { names: { abrasive: name(carbide), usual: name(wanted) } })];
}
