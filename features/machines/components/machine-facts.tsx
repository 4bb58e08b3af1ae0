import { Facts, type Part } from '@/features/records';
import { useShop } from '@/features/session';
import { Screen } from '@/features/ui/screen';
import { Small } from '@/features/ui/text';

import { useMachinesPlace } from '../place';

interface MachineFactsProps<Values> {
  title: string;
  parts: readonly Part<Values>[];
  values: Values;
}

/** A machine to be read, for those who do not edit it. */
export function MachineFacts<Values>({ title, parts, values }: MachineFactsProps<Values>) {
  const { shop } = useShop();
  return (
    <Screen title={title} over={shop.name} backTo={useMachinesPlace()} width="form">
      <Facts label={`Facts of ${title}`} parts={parts} values={values} />
      <Small>Leads and machinists edit machines.</Small>
    </Screen>
  );
}
