import { useState } from 'react';
import { View } from 'react-native';

import { SearchField, useAddressPart } from '@/features/records';
import { Button } from '@/features/ui/button';
import { Cell, Row, Stack } from '@/features/ui/card';
import { EmptyState } from '@/features/ui/empty-state';
import { Notice } from '@/features/ui/notice';
import { Screen } from '@/features/ui/screen';
import { Segmented } from '@/features/ui/segmented';
import { Body, Heading, Small } from '@/features/ui/text';

import { SourceFold } from './components/source-fold';
import { byMark, openLedger, searched, tally, type MarkGroup, type SourceEntry } from './ledger';
import { counted, MARKS } from './words';

/** A search that leaves this many checks or fewer shows them at once. */
const SHOWN_AT_ONCE = 40;

/** Every source of the rules, and every check against one, carried out on this device when the page opens. */
export function NumbersScreen() {
  const [ledger] = useState(openLedger);
  const [search] = useAddressPart('search');
  const [only, setOnly] = useAddressPart('source');
  const [show, setShow] = useAddressPart('show');
  const whole = tally(ledger);
  const one = ledger.find(({ id }) => id === only);
  const found = searched(ledger, search);
  const shown = show === 'all' ? found : found.filter(({ checks }) => checks.length > 0);

  return (
    <Screen
      title="Where the numbers come from"
      backTo="/"
      backToLast
      header={
        <Body tone="onEnamelSoft">
          {`${counted(whole.checks, 'check')} against ${counted(whole.sources, 'source')}, worked out on this device just now: ${
            whole.missed === 0 ? 'all agree.' : `${whole.missed} differ.`
          }`}
        </Body>
      }
    >
      {whole.missed > 0 ? (
        <Notice kind="error">
          {`${counted(whole.missed, 'number')} came out otherwise than the source says. Do not rely on the plans of this device.`}
        </Notice>
      ) : null}
      {only === '' ? (
        <>
          <Row align="flex-start">
            <Cell least={260}>
              <SearchField
                name="numbers-search"
                label="Search"
                hint="A source, a figure, a material: hardened, p. 1318, ct"
                maxLength={60}
              />
            </Cell>
            <Cell least={260}>
              <Segmented
                name="numbers-show"
                label="Sources"
                options={[
                  { value: 'checked', label: 'with checks' },
                  { value: 'all', label: `all ${ledger.length}` },
                ]}
                value={show === 'all' ? 'all' : 'checked'}
                onChange={(value) => setShow(value === 'all' ? 'all' : '')}
              />
            </Cell>
          </Row>
          <Groups entries={shown} opened={search} />
        </>
      ) : (
        <OnlyOne entry={one} onLeave={() => setOnly('')} />
      )}
    </Screen>
  );
}

/** The source that a working led to. */
function OnlyOne({ entry, onLeave }: { entry: SourceEntry | undefined; onLeave: () => void }) {
  const way = <Button label="Show all sources" onPress={onLeave} />;
  if (entry === undefined)
    return (
      <EmptyState title="There is no such source" action={way}>
        The address may be mistyped, or the rules no longer use it.
      </EmptyState>
    );
  return (
    <Stack>
      <Row>{way}</Row>
      <Groups entries={[entry]} opened={entry.id} />
    </Stack>
  );
}

interface GroupsProps {
  entries: readonly SourceEntry[];
  /** What narrowed the list down; a short list of it stands open. */
  opened: string;
}

function Groups({ entries, opened }: GroupsProps) {
  if (entries.length === 0)
    return (
      <EmptyState title="Nothing holds all of these words">
        Search for fewer words, or show all sources.
      </EmptyState>
    );
  const startOpen =
    opened !== '' && (entries.length === 1 || tally(entries).checks <= SHOWN_AT_ONCE);
  return (
    <Stack gap={6}>
      {byMark(entries).map((group) => (
        <Group key={`${group.mark}-${opened}`} group={group} startOpen={startOpen} />
      ))}
    </Stack>
  );
}

function Group({ group, startOpen }: { group: MarkGroup; startOpen: boolean }) {
  const { heading, meaning } = MARKS[group.mark];
  const { checks } = tally(group.entries);
  const count = [
    counted(group.entries.length, 'source'),
    ...(checks > 0 ? [counted(checks, 'check')] : []),
  ].join(', ');
  return (
    <Stack gap={2}>
      <View>
        <Heading>{heading}</Heading>
        <Small>{`${meaning} ${count}.`}</Small>
      </View>
      <View>
        {group.entries.map((entry) => (
          <SourceFold key={entry.id} entry={entry} startOpen={startOpen} />
        ))}
      </View>
    </Stack>
  );
}
