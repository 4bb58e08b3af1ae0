import { useState } from 'react';

import { useShop } from '@/features/session';
import { Button } from '@/features/ui/button';
import { Card, Cell, Row, Stack } from '@/features/ui/card';
import { List, ListRow } from '@/features/ui/list-row';
import { Notice } from '@/features/ui/notice';
import { Body, Heading, Strong, Subheading } from '@/features/ui/text';
import type { RecordedEntry, WheelLife } from '@/shared/contracts/wheel-entries';
import type { Signer } from '@/shared/domain/wheel-life';
import { formatQuantity } from '@/shared/units/format';

import { entryWords, SIGNER_WORDS } from '../entry-words';
import { likelyStep, refusedSteps } from '../next-step';
import type { FormKind } from '../step-form';
import { STEP_LABELS } from '../words';
import { SetAsideSheet } from './set-aside';
import { StepSheet } from './step-sheet';

interface Opened {
  kind: FormKind;
  needs: Signer | null;
  entryId: string | null;
}

/** What may be recorded of the wheel now, what may not and why, and what waits for a signature. */
export function WheelSteps({ life }: { life: WheelLife }) {
  const { shop, may } = useShop();
  const [opened, setOpened] = useState<Opened | null>(null);
  const [asking, setAsking] = useState(false);
  const [recorded, setRecorded] = useState<RecordedEntry | null>(null);
  const open = (kind: FormKind, needs: Signer | null, entryId: string | null = null) => {
    setRecorded(null);
    setOpened({ kind, needs, entryId });
  };
  const likely = likelyStep(life, shop.rules.trialRunMinutes);
  const allowed = life.steps.filter(({ refusal }) => refusal === null);
  const others = allowed.filter((step) => step !== likely);
  const refused = refusedSteps(life.steps);
  return (
    <Stack gap={3}>
      <Heading>Next</Heading>
      {recorded ? <Recorded recorded={recorded} life={life} /> : null}
      <Waiting life={life} onSign={(entryId) => open('countersigned', null, entryId)} />
      {likely && isForm(likely.kind) ? (
        <Button
          kind="primary"
          size="machine"
          wide
          label={STEP_LABELS[likely.kind]}
          onPress={() => isForm(likely.kind) && open(likely.kind, likely.needs)}
        />
      ) : null}
      <Row gap={2}>
        {others.map(({ kind, needs }) =>
          isForm(kind) ? (
            <Cell key={kind} least={136}>
              <Button wide label={STEP_LABELS[kind]} onPress={() => open(kind, needs)} />
            </Cell>
          ) : null,
        )}
        {isOutOfUse(life) || !may('wheel:set-aside') ? null : (
          <Cell least={136}>
            <Button
              kind="danger"
              wide
              label={STEP_LABELS['set aside']}
              spoken={`Set ${life.wheel.tag} aside`}
              onPress={() => setAsking(true)}
            />
          </Cell>
        )}
      </Row>
      {refused.length > 0 ? (
        <Card kind="well">
          <Subheading>Not now</Subheading>
          {refused.map(({ kinds, why }) => (
            <Body key={why}>
              <Strong>{`${kinds.map((kind) => STEP_LABELS[kind]).join(', ')}: `}</Strong>
              {why}
            </Body>
          ))}
        </Card>
      ) : null}
      {asking ? <SetAsideSheet wheel={life.wheel} onClose={() => setAsking(false)} /> : null}
      {opened ? (
        <StepSheet
          key={`${opened.kind}:${opened.entryId ?? ''}`}
          life={life}
          {...opened}
          onClose={() => setOpened(null)}
          onRecorded={(next) => {
            setOpened(null);
            setRecorded(next);
          }}
        />
      ) : null}
    </Stack>
  );
}

const isOutOfUse = ({ wheel }: WheelLife) =>
  wheel.data.state === 'set aside' || wheel.data.state === 'scrapped';

const isForm = (kind: WheelLife['steps'][number]['kind']): kind is FormKind =>
  kind !== 'received' && kind !== 'set aside';

function Recorded({ recorded, life }: { recorded: RecordedEntry; life: WheelLife }) {
  const { units } = useShop();
  const { entry, wheel } = recorded;
  const reader = { units, spindles: life.spindles, entries: life.entries.items };
  const size = formatQuantity({ value: wheel.data.diameterNowMm, unit: 'mm' }, units);
  return (
    <Notice kind="done">
      {[
        `Recorded: ${entryWords(entry.step, reader)}.`,
        entry.step.kind === 'dressed' ? `It is ${size} now.` : '',
        entry.needs === null ? '' : `It waits for the signature of ${SIGNER_WORDS[entry.needs]}.`,
      ]
        .filter(Boolean)
        .join(' ')}
    </Notice>
  );
}

interface WaitingProps {
  life: WheelLife;
  onSign: (entryId: string) => void;
}

/** Entries that wait for a signature, with the means to sign for those who may. */
function Waiting({ life, onSign }: WaitingProps) {
  const { units } = useShop();
  const { waiting } = life.standing;
  const { items } = life.entries;
  if (waiting.length === 0) return null;
  const reader = { units, spindles: life.spindles, entries: items };
  return (
    <List label="Waiting for a signature">
      {waiting.map(({ entryId, kind, needs, refusal }) => {
        const entry = items.find(({ id }) => id === entryId);
        const words = entry ? entryWords(entry.step, reader) : STEP_LABELS[kind];
        const detail = `${entry ? `${entry.person.name}; waits` : 'Waits'} for ${SIGNER_WORDS[needs]}. ${refusal?.words ?? ''}`;
        return (
          <ListRow
            key={entryId}
            label={words}
            detail={detail}
            aside={
              refusal === null ? (
                <Button label="Sign" spoken={`Sign for ${words}`} onPress={() => onSign(entryId)} />
              ) : null
            }
          />
        );
      })}
    </List>
  );
}
