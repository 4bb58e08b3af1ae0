import { FindingList } from '@/features/plan';
import { Stack } from '@/features/ui/card';
import { List, ListRow } from '@/features/ui/list-row';
import { Sheet } from '@/features/ui/sheet';
import { Body, Small, Subheading } from '@/features/ui/text';
import { verdictWords } from '@/features/ui/verdict';
import type { SetupPart } from '@/shared/domain/setups';

import { usePlanner } from '../planner-context';
import { verdictCount } from '../verdict-count';
import { PART_WORDS } from '../words';
import { CautionList } from './caution-list';
import { OrderOfWork } from './order-of-work';

interface FindingsSheetProps {
  open: boolean;
  onClose: () => void;
  onPart: (part: SetupPart) => void;
}

/** Behind the verdict: what is missing, what was found, then the order of the work and its cautions. */
export function FindingsSheet({ open, onClose, onPart }: FindingsSheetProps) {
  const { plan } = usePlanner();
  return (
    <Sheet open={open} onClose={onClose} title={verdictWords(plan.verdict, verdictCount(plan))}>
      <Stack>
        <Needs
          onPart={(part) => {
            onPart(part);
            onClose();
          }}
        />
        {plan.findings.length > 0 ? <FindingList findings={plan.findings} sourced /> : null}
        {plan.findings.length === 0 && plan.needs.length === 0 ? (
          <Body>Nothing was found against this plan. The cautions below hold all the same.</Body>
        ) : null}
        <Subheading>Order of the work</Subheading>
        <OrderOfWork />
        <Subheading>Cautions for this plan</Subheading>
        <CautionList />
      </Stack>
    </Sheet>
  );
}

/** What is still missing; a row leads to the part where it is asked. */
export function Needs({ onPart }: { onPart: (part: SetupPart) => void }) {
  const { plan } = usePlanner();
  if (plan.needs.length === 0) return null;
  return (
    <>
      <Small>Still needed for a whole plan:</Small>
      <List label="Still needed">
        {plan.needs.map(({ part, field, label }) => (
          <ListRow
            key={field}
            label={label}
            detail={PART_WORDS[part]}
            onPress={() => onPart(part)}
          />
        ))}
      </List>
    </>
  );
}
