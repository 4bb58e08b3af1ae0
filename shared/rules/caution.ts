import type { Material } from '../domain/materials';
import type { Operation } from '../domain/setups';
import type { SourceId } from './sources';

export const CAUTION_SUBJECTS = [
  'First of all',
  'Wheel soundness',
  'Speed',
  'Mounting and flanges',
  'Guards and clearance',
  'Rotation',
  'Dressing',
  'Grinding',
  'Dust and mist',
  'Fire',
  'Hands and clothing',
  'The lathe',
] as const;
export type CautionSubject = (typeof CAUTION_SUBJECTS)[number];

/** Something that always holds. Where a condition is given, it belongs to those plans alone. */
export interface Caution {
  subject: CautionSubject;
  words: string;
  source: SourceId;
  operations?: readonly Operation[];
  materials?: readonly Material[];
  mounted?: boolean;
}
