import { useFormikContext } from 'formik';

import { TextField } from '@/features/forms';
import { ChoiceField, RecordForm } from '@/features/records';
import { TimeZoneSelect, useShop } from '@/features/session';
import { Button } from '@/features/ui/button';
import { shop as shopContract, type Shop } from '@/shared/contracts/shops';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { UNIT_SYSTEMS, type UnitSystem } from '@/shared/domain/people';

import { isShopValues, shopParts, shopSchema, toRequest, UNIT_WORDS, valuesOf } from './form';
import type { ShopValues } from './form';
import { useUpdateShop } from './queries';

/** The lead edits name, units and time zone of the shop. */
export function ShopForm({ onDone }: { onDone: () => void }) {
  const { shop, units } = useShop();
  const update = useUpdateShop(shop.id);
  return (
    <RecordForm<ShopValues, Shop>
      title="Edit the shop"
      actions={<Button kind="onEnamel" label="Back to the shop" onPress={onDone} />}
      noun="shop"
      subject="shop"
      start={{ values: valuesOf(shop, units), version: shop.version }}
      isValues={isShopValues}
      schema={shopSchema}
      parts={() => shopParts}
      save={(values, version) =>
        update.mutateAsync({ version: version ?? shop.version, ...toRequest(values) })
      }
      stored={storedShop}
      fetchCurrent={() => Promise.resolve(shop)}
      onSaved={onDone}
    >
      {() => <ShopFields />}
    </RecordForm>
  );
}

function storedShop(current: unknown, units: UnitSystem) {
  const { success, data } = shopContract.safeParse(current);
  return success ? { values: valuesOf(data, units), version: data.version } : null;
}

function ShopFields() {
  const { values, errors, setFieldValue } = useFormikContext<ShopValues>();
  return (
    <>
      <TextField
        name="name"
        label="Name"
        hint={`At most ${TEXT_LIMITS.name} characters.`}
        maxLength={TEXT_LIMITS.name}
        required
      />
      <ChoiceField
        name="shopUnits"
        label="Units of the shop"
        hint="Each person can read in the other at any time."
        options={UNIT_SYSTEMS.map((value) => ({ value, label: UNIT_WORDS[value] }))}
      />
      <TimeZoneSelect
        value={values.timeZone}
        onChange={(zone) => void setFieldValue('timeZone', zone)}
        error={errors.timeZone}
      />
    </>
  );
}
