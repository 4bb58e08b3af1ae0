import { useReader } from '@/features/plan';
import { List, ListRow } from '@/features/ui/list-row';
import { orderOfWork } from '@/shared/rules';
import { formatQuantity } from '@/shared/units/format';

import { usePlanner } from '../planner-context';

/** The work from survey to the last measurement, with the plan's own figures. */
export function OrderOfWork() {
  const { plan, input } = usePlanner();
  const { units } = useReader();
  const steps = orderOfWork(plan, input);
  return (
    <List label="Order of the work">
      {steps.map(({ id, title, words, figures }, index) => (
        <ListRow
          key={id}
          label={`${index + 1}. ${title}`}
          detail={words.replace(/\{(\w+)\}/g, (_, key: string) => {
            const quantity = figures[key];
            return quantity ? formatQuantity(quantity, units) : '–';
          })}
        />
      ))}
    </List>
  );
}
