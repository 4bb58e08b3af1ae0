import * as yup from 'yup';

import { dateText, entryRules, readDate, type TypedEntry } from '@/features/records';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import type { UnitSystem } from '@/shared/domain/people';
import { formatQuantity } from '@/shared/units/format';

import { MANDREL_FIELDS, WHEEL_FIELDS } from './fields';
import type { WheelValues } from './form';
import { speedRule } from './marked-speed';

const notLarger = (units: UnitSystem) =>
  yup.mixed<TypedEntry>().test('not larger', (now, { parent, createError }) => {
    const fresh = (parent as WheelValues).diameterNewMm.si;
    if (!now || now.si === null || fresh === null || now.si <= fresh) return true;
    const limit = formatQuantity({ value: fresh, unit: 'mm' }, units, { rounding: 'down' });
    return createError({ message: `Diameter now is at most ${limit}, the diameter when new.` });
  });

const holeFits = (units: UnitSystem) =>
  yup.mixed<TypedEntry>().test('hole fits', (hole, { parent, createError }) => {
    const { diameterNewMm, diameterNowMm, isMounted } = parent as WheelValues;
    const outer = diameterNowMm.si ?? diameterNewMm.si;
    if (!hole) return true;
    if (hole.text.trim() === '' && !isMounted)
      return createError({ message: 'Enter the hole; 0 where there is none.' });
    if (hole.si === null || outer === null || hole.si < outer) return true;
    const limit = formatQuantity({ value: outer, unit: 'mm' }, units, { rounding: 'down' });
    return createError({ message: `Hole is smaller than the wheel, ${limit}.` });
  });

const smallestFits = (units: UnitSystem) =>
  yup.mixed<TypedEntry>().test('smallest fits', (smallest, { parent, createError }) => {
    const { diameterNewMm, holeMm } = parent as WheelValues;
    if (!smallest || smallest.si === null) return true;
    const words = (value: number) => formatQuantity({ value, unit: 'mm' }, units);
    if (diameterNewMm.si !== null && smallest.si > diameterNewMm.si)
      return createError({
        message: `Smallest usable diameter is at most ${words(diameterNewMm.si)}, the diameter when new.`,
      });
    if (holeMm.si !== null && smallest.si <= holeMm.si)
      return createError({
        message: `Smallest usable diameter is above the hole, ${words(holeMm.si)}.`,
      });
    return true;
  });

const afterMade = yup
  .string()
  .default('')
  .test('after made', 'A wheel expires after it was made.', (text, { parent }) => {
    const [made, expires] = [readDate((parent as WheelValues).madeOn), readDate(text ?? '')];
    return made === null || expires === null || made <= expires;
  });

const atMost = (label: string, most: number) =>
  yup.string().trim().max(most, `${label} has at most ${most} characters.`);

export function wheelSchema({ units, speedUnit, isMounted }: WheelValues) {
  const rules = entryRules(WHEEL_FIELDS, units, ['diameterNewMm', 'widthMm']);
  return yup.object({
    tag: yup
      .string()
      .trim()
      .required('Enter the tag: the name under which the wheel hangs on the rack.')
      .max(TEXT_LIMITS.tag, `The tag has at most ${TEXT_LIMITS.tag} characters.`),
    marking: atMost('The marking', TEXT_LIMITS.marking),
    ...rules,
    diameterNowMm: rules.diameterNowMm.concat(notLarger(units)),
    holeMm: rules.holeMm.concat(holeFits(units)),
    markedSpeedMPerS: speedRule(speedUnit),
    ...(isMounted
      ? {
          mounted: yup.object(
            entryRules(MANDREL_FIELDS, units, ['mandrelDiameterMm', 'overhangMm']),
          ),
        }
      : {}),
    smallestUsableMm: rules.smallestUsableMm.concat(smallestFits(units)),
    receivedOn: dateText('Received on'),
    madeOn: dateText('Made on'),
    expiresOn: dateText('Expires on').concat(afterMade),
    place: atMost('Place', TEXT_LIMITS.place),
    notes: atMost('Notes', TEXT_LIMITS.note),
  });
}
