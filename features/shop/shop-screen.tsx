import { Facts, useAddressPart } from '@/features/records';
import { useShop } from '@/features/session';
import { Button } from '@/features/ui/button';
import { Cell, Row, Stack } from '@/features/ui/card';
import { List, ListRow } from '@/features/ui/list-row';
import { Screen } from '@/features/ui/screen';
import { Heading, Small } from '@/features/ui/text';

import { Members } from './components/members';
import { OwnSettings } from './components/own-settings';
import { ShopSwitch } from './components/shop-switch';
import { shopParts, valuesOf } from './form';
import { ShopForm } from './shop-form';

/** The shop's machines and people, and one's own settings. */
export function ShopScreen() {
  const { shop, units, may } = useShop();
  const [edit, setEdit] = useAddressPart('edit');
  const mayEdit = may('shop:update');
  if (edit && mayEdit) return <ShopForm onDone={() => setEdit('')} />;
  return (
    <Screen title="Shop" over={shop.name} actions={<ShopSwitch kind="onEnamel" />}>
      <Row gap={6} align="flex-start">
        <Cell least={300}>
          <Stack gap={6}>
            <List label="What the shop keeps">
              <ListRow
                label="Machines"
                detail="Lathes, tool-post grinders, quills and arbors"
                href={{ pathname: '/shops/[shopId]/machines', params: { shopId: shop.id } }}
              />
              <ListRow
                label="Where the numbers come from"
                detail="The books, standards and laws behind the rules, and what is checked against them"
                href="/numbers"
              />
              <ListRow
                label="Appointed people"
                detail="Who may mount, dress and trial-run a wheel, and sign for others"
                href={{ pathname: '/shops/[shopId]/appointments', params: { shopId: shop.id } }}
              />
            </List>
            <Stack gap={2}>
              <Heading>The shop</Heading>
              <Facts label="The shop" parts={shopParts} values={valuesOf(shop, units)} />
              {mayEdit ? (
                <Row>
                  <Button
                    label="Edit"
                    spoken="Edit the shop"
                    icon="edit"
                    onPress={() => setEdit('yes')}
                  />
                </Row>
              ) : (
                <Small>A lead edits name, units and time zone.</Small>
              )}
            </Stack>
            <Stack gap={2}>
              <Heading>People</Heading>
              <Members />
            </Stack>
          </Stack>
        </Cell>
        <Cell least={300}>
          <Stack gap={2}>
            <Heading>You</Heading>
            <OwnSettings />
          </Stack>
        </Cell>
      </Row>
    </Screen>
  );
}
