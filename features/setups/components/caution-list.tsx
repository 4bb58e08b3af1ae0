import { sourceWords } from '@/features/plan';
import { Stack } from '@/features/ui/card';
import { Body, Small } from '@/features/ui/text';
import { CAUTIONS } from '@/shared/rules';

import { usePlanner } from '../planner-context';

/** Cautions that always hold for such work: they never colour the verdict. */
export function CautionList() {
  const { plan } = usePlanner();
  return (
    <Stack gap={3}>
      {plan.cautions.map((id) => {
        const { words, source } = CAUTIONS[id];
        const { title, place, mark } = sourceWords(source);
        return (
          <Stack key={id} gap={1}>
            <Body>{words}</Body>
            <Small>{[title, place, mark].filter(Boolean).join(', ')}</Small>
          </Stack>
        );
      })}
      <Small>
        The wheel’s marking, the makers’ manuals, local law and a competent person come first.
      </Small>
    </Stack>
  );
}
