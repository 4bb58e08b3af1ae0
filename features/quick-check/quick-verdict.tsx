import { FigureReadout, figureText, FindingList, useReader } from '@/features/plan';
import { Card, Stack } from '@/features/ui/card';
import { LimitBar } from '@/features/ui/limit-bar';
import { ReadoutRow } from '@/features/ui/readout';
import { Body, Small } from '@/features/ui/text';
import { VerdictAnnouncer, VerdictBadge } from '@/features/ui/verdict';
import type { QuickCheck } from '@/shared/rules';

const DOWN = { rounding: 'down' } as const;

/** The answer: the verdict in words, how near the limit is, and the figures with their working. */
export function QuickVerdict({ check }: { check: QuickCheck }) {
  const { units } = useReader();
  const { verdict, needs, findings, rpm, limit, surfaceSpeed } = check;
  const count =
    verdict === 'incomplete'
      ? needs.length
      : findings.filter(({ level }) => level === verdict).length;
  return (
    <Stack>
      <VerdictAnnouncer verdict={verdict} count={count} />
      {verdict === 'stop' ? null : <VerdictBadge verdict={verdict} count={count} />}
      <FindingList findings={findings} {...(verdict === 'stop' ? { headline: 'too fast' } : {})} />
      <Card>
        {verdict === 'incomplete' ? (
          <Body tone="textSoft">{`Still needed: ${needs.map(({ label }) => label).join(', ')}.`}</Body>
        ) : null}
        {verdict === 'clear' || verdict === 'check' ? (
          <Body>
            {`${figureText(rpm, units)} is within the wheel’s limit of ${figureText(limit, units, DOWN)}. The rim runs at ${figureText(surfaceSpeed, units)}.`}
          </Body>
        ) : null}
        {rpm.value !== null && limit.value !== null ? (
          <LimitBar
            value={rpm.value}
            limit={limit.value}
            startLabel="0 rpm"
            limitLabel={`limit ${figureText(limit, units, DOWN)}`}
          />
        ) : null}
        <ReadoutRow>
          <FigureReadout label="Spindle" figure={rpm} />
          <FigureReadout label="Rim speed" figure={surfaceSpeed} />
          <FigureReadout label="Limit" figure={limit} options={DOWN} />
        </ReadoutRow>
        <Small>Press a figure for its working.</Small>
      </Card>
    </Stack>
  );
}
