import { useShop } from '@/features/session';
import { NewSetup } from '@/features/setups';
import { ButtonLink } from '@/features/ui/link';
import { List, ListRow } from '@/features/ui/list-row';
import { Card, Row } from '@/features/ui/card';
import { Body, Heading, Label } from '@/features/ui/text';

/** How much of what a plan stands on is there. */
export interface Counts {
  lathes: number;
  grinders: number;
  wheels: number;
  setups: number;
}

/** Leads a new shop to its first plan, in the order in which a plan needs things. */
export function FirstSteps({ counts }: { counts: Counts }) {
  const { shop, may } = useShop();
  const params = { shopId: shop.id };
  const steps = [
    {
      done: counts.lathes > 0,
      label: 'Add a lathe',
      detail: 'Its speeds, feeds and dials.',
      href: { pathname: '/shops/[shopId]/machines/lathes/new', params } as const,
    },
    {
      done: counts.grinders > 0,
      label: 'Add a grinder',
      detail: 'Its belt steps, quills and arbors.',
      href: { pathname: '/shops/[shopId]/machines/grinders/new', params } as const,
    },
    {
      done: counts.wheels > 0,
      label: 'Add a wheel',
      detail: 'Its marking, sizes and marked speed.',
      href: { pathname: '/shops/[shopId]/wheels/new', params } as const,
    },
  ];
  const next = steps.find(({ done }) => !done);
  const mayAdd = may('machine:edit') && may('wheel:edit');
  return (
    <Card>
      <Heading>Towards the first plan</Heading>
      <List label="Steps towards the first plan">
        {steps.map(({ done, label, detail }, index) => (
          <ListRow
            key={label}
            label={`${index + 1}. ${label}`}
            detail={detail}
            aside={<Label>{done ? 'done' : 'to do'}</Label>}
          />
        ))}
        <ListRow
          label={`${steps.length + 1}. Plan a job`}
          detail="Chuck jaws, a bore or an outside cylinder."
          aside={<Label>{counts.setups > 0 ? 'done' : 'to do'}</Label>}
        />
      </List>
      {next && !mayAdd ? (
        <Body>
          A lead or machinist adds machines and wheels. You can plan as soon as they are here.
        </Body>
      ) : (
        <Row>
          {next ? (
            <ButtonLink kind="primary" icon="add" label={next.label} href={next.href} />
          ) : (
            <NewSetup />
          )}
        </Row>
      )}
    </Card>
  );
}
