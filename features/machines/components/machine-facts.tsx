import { Facts, type Part } from '@/features/records';
import { useShop } from '@/features/session';
import { Row } from '@/features/ui/card';
import { ButtonLink } from '@/features/ui/link';
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
  const machines = useMachinesPlace();
  return (
    <Screen title={title} over={shop.name} backTo={machines} width="form">
      <Facts label={`Facts of ${title}`} parts={parts} values={values} />
      <Small>Leads and machinists edit machines.</Small>
      <Row>
        <ButtonLink label="All machines" href={machines} />
      </Row>
    </Screen>
  );
}
