import { Stack } from '@/features/ui/card';
import { Fold } from '@/features/ui/fold';
import { Subheading } from '@/features/ui/text';
import { useLayout } from '@/features/ui/use-layout';

import { usePlanner } from '../planner-context';
import { SetupToScale } from './pictures/setup-to-scale';

/** On a phone the set-up is drawn in a fold of the machine's part; a wide screen has it in the plan. */
export function SetupPictureFold() {
  const { wide } = useLayout();
  const { input, plan, values } = usePlanner();
  if (wide) return null;
  return (
    <Fold label="The set-up, to scale" value="from above">
      <SetupToScale input={input} plan={plan} units={values.units} />
    </Fold>
  );
}

export function SetupPicturePane() {
  const { input, plan, values } = usePlanner();
  return (
    <Stack gap={2}>
      <Subheading>The set-up, to scale</Subheading>
      <SetupToScale input={input} plan={plan} units={values.units} />
    </Stack>
  );
}
