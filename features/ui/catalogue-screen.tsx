import { useState } from 'react';
import type { ReactNode } from 'react';

import { Button, IconButton } from './button';
import { Card, Cell, Row, Stack } from './card';
import { CatalogueFields } from './catalogue-fields';
import { Chip } from './chip';
import { EmptyState } from './empty-state';
import { FindingCard } from './finding-card';
import { Fold } from './fold';
import { Icon, VerdictIcon } from './icon';
import { CautionIcon } from './caution-icon';
import { cautionSubjects } from './caution-paths';
import { icons } from './icon-paths';
import type { IconName } from './icon-paths';
import { LimitBar } from './limit-bar';
import { List, ListRow } from './list-row';
import { Notice, Progress } from './notice';
import { PaletteSwitch } from './palette-switch';
import { Readout, ReadoutRow } from './readout';
import { Screen } from './screen';
import { Sheet } from './sheet';
import { Skeleton } from './skeleton';
import { Table } from './table';
import {
  Body,
  Display,
  Engraved,
  Heading,
  Label,
  NumeralHuge,
  Reading,
  Small,
  Strong,
  Subheading,
} from './text';
import { VerdictBadge } from './verdict';
import { WorkingSheet } from './working-sheet';

const WORKING = {
  formula: '{N} = 60 000 {v} / (π {D})',
  terms: [
    { symbol: 'v', meaning: 'Marked speed', value: '25', unit: 'm/s' },
    { symbol: 'D', meaning: 'Diameter when new', value: '31.75', unit: 'mm', assumed: true },
  ],
  result: '15\u00a0038 rpm',
  note: 'Always with the new diameter, however far the wheel is worn.',
  source: '29 CFR 1910.215(d)(1)',
  mark: 'law',
};

const PASSES = [
  { id: '1', group: '1–9 rough', dial: '+5 div each', left: '0.044' },
  { id: '2', group: '10–12 spark-out', dial: 'leave', left: '0.033' },
  {
    id: '3',
    group: 'Measure cold, dress fine, touch off, set the dial to zero',
    dial: null,
    left: '',
  },
  { id: '4', group: '13–19 finish', dial: '+2 div each', left: '0.002' },
];

/** Every primitive in every state; a page for those who build screens, left out of what ships. */
export function CatalogueScreen({ children }: { children?: ReactNode }) {
  const [sheet, setSheet] = useState<'none' | 'working' | 'box'>('none');
  const [due, setDue] = useState(true);
  const close = () => setSheet('none');
  return (
    <Screen
      title="Catalogue"
      over="Setup · draft, saved 10:42"
      actions={<Button kind="onEnamel" label="Sign in" />}
    >
      <PaletteSwitch />
      <Stack gap={2}>
        <Display>May this wheel run at this speed?</Display>
        <Heading>Where each jaw starts to touch</Heading>
        <Subheading>Look, then listen</Subheading>
        <Engraved>Belt step</Engraved>
        <Reading>Clean and dry the wheel. Turn it in good light and look for chips.</Reading>
        <Body>
          15 438 rpm is above the wheel’s limit of 15 038 rpm. π √ × · ≤ ≥ ² ³ ° − ½ ⅛ Łódź
        </Body>
        <Strong>R-14 · A 60 K 7 V</Strong>
        <Label>Wheel diameter, new</Label>
        <Small>32 × 16 × 10 mm, marked 25 m/s on the box</Small>
        <NumeralHuge>30</NumeralHuge>
      </Stack>
      {children}
      <Row>
        <Button kind="primary" label="Add a wheel" icon="add" />
        <Button label="Change" />
        <Button kind="quiet" label="Undo" icon="undo" />
        <Button kind="danger" label="Set aside" />
        <Button kind="dangerFilled" label="Stop now" />
        <Button kind="primary" label="Saving" busy />
        <Button label="Not now" disabled />
        <IconButton label="Search" icon="search" onPress={() => undefined} />
      </Row>
      <Button kind="primary" size="machine" wide label="Pass done" />
      <Row>
        <VerdictBadge verdict="incomplete" count={3} onPress={() => setSheet('box')} />
        <VerdictBadge verdict="clear" count={0} />
        <VerdictBadge verdict="check" count={2} />
        <VerdictBadge verdict="stop" count={1} size="small" />
      </Row>
      <FindingCard level="check">jaws have gaps. Fit a fixed shield and sign for it.</FindingCard>
      <FindingCard level="stop" headline="too fast" source="29 CFR 1910.215(d)(1)">
        15 438 rpm is above the wheel’s limit of 15 038 rpm. The rim would run at 25.7 m/s; the
        marking allows 25.
      </FindingCard>
      <LimitBar value={15438} limit={15038} startLabel="0 rpm" limitLabel="limit 15 038" />
      <FindingCard level="note">the wheel will act soft at this speed.</FindingCard>
      <ReadoutRow ruled>
        <Readout label="Spindle step" value="D" unit="11 400 rpm" />
        <Readout
          label="Wheel speed"
          value="19.1"
          unit="m/s"
          spokenUnit="metres per second"
          onPress={() => setSheet('working')}
        />
        <Readout label="Work" value={null} unit="rpm" />
        <Readout label="To clean up" value="0.143" unit="mm" size="large" />
      </ReadoutRow>
      <CatalogueFields />
      <Row>
        <Chip label="All, 44" on={!due} onToggle={() => setDue(!due)} />
        <Chip label="Due" on={due} onToggle={() => setDue(!due)} />
      </Row>
      <Row align="flex-start">
        <Cell least={280}>
          <List label="Setups">
            <ListRow
              label="True jaws, 200 mm chuck"
              detail="Jaws · draft, 10:42"
              aside={<VerdictBadge verdict="check" count={1} size="small" />}
              onPress={() => undefined}
              current
            />
            <ListRow label="Spindle bore" detail="Bore · cleared" onPress={() => undefined} />
          </List>
        </Cell>
        <Cell least={280}>
          <Table
            caption="Passes"
            columns={[
              { id: 'group', label: 'Passes', cell: (row) => row.group },
              { id: 'dial', label: 'Dial', numeric: true, cell: (row) => row.dial },
              { id: 'left', label: 'Metal left, mm', numeric: true, cell: (row) => row.left },
            ]}
            rows={PASSES}
            rowKey={(row) => row.id}
            spanning={(row) => (row.dial === null ? row.group : null)}
            dense
          />
        </Cell>
      </Row>
      <Card kind="engraved">
        <Engraved>R-14 · type 1</Engraved>
        <Display level={2}>A 60 K 7 V</Display>
      </Card>
      <Fold label="All limits" value="marking, quill 24 700, spindle 20 000">
        <Body>Inside the fold.</Body>
      </Fold>
      <Fold label="Checked before mounting" value="looked at, rung" startOpen>
        <Body>Inside the fold.</Body>
      </Fold>
      <Notice kind="done">Saved 10:42.</Notice>
      <Notice kind="error" action={<Button label="Try again" />}>
        The server cannot be reached. What you typed is kept on this device.
      </Notice>
      <Progress label="Reading 120 rows" share={0.4} onCancel={<Button label="Cancel" />} />
      <EmptyState
        icon="rack"
        title="No wheels yet"
        action={<Button kind="primary" label="Add a wheel" />}
      >
        The Rack holds the shop’s wheels with their marking and limits. A setup takes its wheel from
        here.
      </EmptyState>
      <Skeleton label="Loading the setup" />
      <Row>
        {(Object.keys(icons) as IconName[]).map((name) => (
          <Icon key={name} name={name} size={32} />
        ))}
        {(['incomplete', 'clear', 'check', 'stop'] as const).map((verdict) => (
          <VerdictIcon key={verdict} verdict={verdict} size={32} />
        ))}
      </Row>
      <Row>
        {cautionSubjects.map((subject) => (
          <CautionIcon key={subject} subject={subject} size={56} />
        ))}
      </Row>
      <WorkingSheet
        open={sheet === 'working'}
        onClose={close}
        title="Limit from the marked speed"
        {...WORKING}
      />
      <Sheet
        open={sheet === 'box'}
        onClose={close}
        shape="box"
        title="Leave without saving?"
        footer={<Button kind="primary" label="Keep editing" onPress={close} />}
      >
        <Body>The last change has not reached the shop’s record.</Body>
      </Sheet>
    </Screen>
  );
}
