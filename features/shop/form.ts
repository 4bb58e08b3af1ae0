import * as yup from 'yup';

import { keyPart, type Part, type RecordValues } from '@/features/records';
import type { Shop, UpdateShopRequest } from '@/shared/contracts/shops';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { UNIT_SYSTEMS, type UnitSystem } from '@/shared/domain/people';

export interface ShopValues extends RecordValues {
  name: string;
  shopUnits: UnitSystem;
  timeZone: string;
}

export const UNIT_WORDS: Record<UnitSystem, string> = { mm: 'Millimetres', inch: 'Inches' };

/** `units` is how the person reads, `shopUnits` what the shop starts everybody with. */
export const valuesOf = (shop: Shop, units: UnitSystem): ShopValues => ({
  id: shop.id,
  units,
  name: shop.name,
  shopUnits: shop.units,
  timeZone: shop.timeZone,
});

export const toRequest = (values: ShopValues): Omit<UpdateShopRequest, 'version'> => ({
  name: values.name.trim(),
  units: values.shopUnits,
  timeZone: values.timeZone,
});

export const shopSchema = () =>
  yup.object({
    name: yup
      .string()
      .trim()
      .required('Enter the name of the shop.')
      .max(TEXT_LIMITS.name, `The name has at most ${TEXT_LIMITS.name} characters.`),
    timeZone: yup.string().required('Choose a time zone.'),
  });

const zoneWords = (zone: string) => zone.replaceAll('_', ' ').replaceAll('/', ', ');

export const shopParts: Part<ShopValues>[] = [
  keyPart('name', 'Name', (name) => name.trim() || '–'),
  keyPart('shopUnits', 'Units of the shop', (units) => UNIT_WORDS[units]),
  keyPart('timeZone', 'Time zone', zoneWords),
];

/** Guards what comes back from the device's storage. */
export function isShopValues(value: unknown): value is ShopValues {
  const shape = value as Partial<ShopValues> | null;
  return (
    typeof shape === 'object' &&
    shape !== null &&
    typeof shape.id === 'string' &&
    typeof shape.name === 'string' &&
    typeof shape.timeZone === 'string' &&
    UNIT_SYSTEMS.some((system) => system === shape.shopUnits)
  );
}
