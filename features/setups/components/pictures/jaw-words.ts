import type { UnitSystem } from '@/shared/domain/people';
import type { JawContact, JawPlan } from '@/shared/rules/types';
import { formatQuantity } from '@/shared/units/format';

const ORDER = ['first', 'second', 'third', 'fourth', 'fifth', 'sixth', 'seventh', 'eighth'];

const millimetres = (value: number, units: UnitSystem, withUnit = true) =>
  formatQuantity({ value, unit: 'mm' }, units, { withUnit, fixed: true });

/** "first", "second", "last" */
function orderWord(contact: JawContact, jaws: number): string {
  if (contact.order === jaws && jaws > 1) return 'last';
  return ORDER[contact.order - 1] ?? `${contact.order}th`;
}

/** Beside a jaw: "2 · first, 0", "3 · second, 0.044". */
export function jawLabel(contact: JawContact, jaws: number, units: UnitSystem): string {
  const infeed = contact.touchesAtMm > 0 ? millimetres(contact.touchesAtMm, units, false) : '0';
  return `${contact.jaw} · ${orderWord(contact, jaws)}, ${infeed}`;
}

/** The picture in words, in the order in which the jaws come to spark. */
export function jawSentences(plan: JawPlan, units: UnitSystem): { jaw: number; words: string }[] {
  const jaws = plan.contacts.length;
  return [...plan.contacts]
    .sort((one, other) => one.order - other.order)
    .map((contact) => {
      const touch =
        contact.order === 1
          ? 'touches first'
          : `touches ${orderWord(contact, jaws)}, after ${millimetres(contact.touchesAtMm, units)} of infeed`;
      return {
        jaw: contact.jaw,
        words: `Jaw ${contact.jaw} ${touch}; clean to the back at ${millimetres(contact.cleanAtMm, units)}`,
      };
    });
}

/** "The jaws sit 0.080 mm off the axis, towards 340°." */
export function offsetSentence(plan: JawPlan, units: UnitSystem): string {
  if (!(plan.eccentricityMm > 0)) return 'The jaws sit on the axis.';
  const towards = formatQuantity({ value: plan.highSpotDeg, unit: 'deg' }, units, { digits: 0 });
  return `The jaws sit ${millimetres(plan.eccentricityMm, units)} off the axis, towards ${towards} from jaw 1.`;
}
