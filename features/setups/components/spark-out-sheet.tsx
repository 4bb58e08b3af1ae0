import { useMemo, useState } from 'react';

import { QuantityInput, readEntry } from '@/features/forms';
import { FigureRow, PlanReader } from '@/features/plan';
import { Button } from '@/features/ui/button';
import { Stack } from '@/features/ui/card';
import { Field } from '@/features/ui/field';
import { List } from '@/features/ui/list-row';
import { Notice } from '@/features/ui/notice';
import { Sheet } from '@/features/ui/sheet';
import { Body, Small } from '@/features/ui/text';
import type { UnitSystem } from '@/shared/domain/people';
import { planSetup } from '@/shared/rules';
import { sparkOutLesson, type SparkOutLesson } from '@/shared/rules/learning';
import { surfaceOf } from '@/shared/rules/surface';
import { unitLabel } from '@/shared/units/entry-units';
import { entryText } from '@/shared/units/format';

import { usePlanner } from '../planner-context';
import { changesOf, GAUGE_STEP, readSizes, SILENCE_WORDS } from '../spark-out';

interface SparkOutSheetProps {
  open: boolean;
  onClose: () => void;
  /** Takes the softness as a text in the person's units. */
  onUse: (text: string) => void;
}

const SECONDS = 60;
const USUAL_STEP = { mm: '0.001', inch: '0.0001' } as const;

/** Sizes read pass by pass during spark-out, and what they teach about the next plan. */
export function SparkOutSheet({ open, onClose, onUse }: SparkOutSheetProps) {
  const { values, plan } = usePlanner();
  const { units } = values;
  const [typed, setTyped] = useState<{ text: string; step: string; units: UnitSystem }>({
    text: '',
    step: USUAL_STEP[units],
    units,
  });
  // A list stays in the units it was begun in; only an empty one follows the person's.
  const own =
    typed.text.trim() === '' && typed.units !== units
      ? { ...typed, units, step: USUAL_STEP[units] }
      : typed;
  const { sizesMm, fault } = readSizes(own.text, own.units);
  const step = readEntry(own.step, GAUGE_STEP, own.units);
  const { side } = surfaceOf(values.inputs);
  const lesson =
    fault === null && step.si !== null && sizesMm.length > 0 && !plan.traverse.plunge
      ? sparkOutLesson(changesOf(sizesMm, side), step.si, {
          traverseMm: plan.traverse.finish.value,
          workMPerS:
            plan.work.workSpeed.value === null ? null : plan.work.workSpeed.value / SECONDS,
          wheelMPerS: plan.speed.wheelSpeed.value,
        })
      : null;
  const learned = lesson === null || lesson.silence !== null ? null : lesson.softness.value;
  return (
    <Sheet
      open={open}
      onClose={onClose}
      title="Sizes of a spark-out"
      footer={
        learned === null ? null : (
          <Button
            label="Plan with it"
            kind="primary"
            wide
            onPress={() => onUse(entryText(Number(learned.toPrecision(4)), '1/mm', units))}
          />
        )
      }
    >
      {/* Of its own, so that a working opens over this sheet. */}
      <PlanReader units={units}>
        <Stack>
          {plan.traverse.plunge ? (
            <Body>
              Here the wheel plunges: turns follow each other uncounted, and sizes teach nothing.
            </Body>
          ) : (
            <>
              <Field
                name="spark-out.sizes"
                label="Sizes, on diameter"
                lines={4}
                unit={unitLabel('mm', own.units)}
                hint="Before the first spark-out pass and after each one, in order; one to a line, or with semicolons between. Measured with wheel withdrawn and work stopped, at the same place."
                error={fault ?? undefined}
                value={own.text}
                onChangeText={(text) => setTyped({ ...own, text })}
              />
              <QuantityInput
                name="spark-out.step"
                spec={GAUGE_STEP}
                units={own.units}
                value={own.step}
                onChangeText={(next) => setTyped({ ...own, step: next })}
                onBlur={() => undefined}
                error={step.error}
              />
              {lesson ? <Lesson lesson={lesson} /> : null}
              <Small>
                Reckoned at this plan’s work speed, wheel speed and finish traverse: the run must
                have gone at the same.
              </Small>
            </>
          )}
        </Stack>
      </PlanReader>
    </Sheet>
  );
}

/** What was seen, and what the plan would make of it; or why nothing can be said. */
function Lesson({ lesson }: { lesson: SparkOutLesson }) {
  const { input, plan } = usePlanner();
  const { fraction, softness, silence } = lesson;
  const next = useMemo(
    () =>
      silence !== null || softness.value === null
        ? null
        : planSetup({ ...input, cut: { ...input.cut, softnessPerMm: softness.value } }).cutFraction,
    [input, silence, softness.value],
  );
  if (silence !== null) return <Notice>{SILENCE_WORDS[silence]}</Notice>;
  return (
    <>
      <List label="What the sizes show">
        <FigureRow label="Cut fraction observed" figure={fraction} />
        <FigureRow label="Softness learned" figure={softness} />
      </List>
      {next === null ? (
        <Notice>Wheel speed, work speed and finish traverse are still missing in this plan.</Notice>
      ) : (
        <List label="What the plan would use">
          <FigureRow
            label="Rough, with it"
            detail="Cut fraction of the plan with what was learned"
            figure={next.rough}
          />
          <FigureRow label="Rough, as planned now" figure={plan.cutFraction.rough} />
          <FigureRow
            label="Finish, with it"
            detail="Cut fraction of the plan with what was learned"
            figure={next.finish}
          />
          <FigureRow label="Finish, as planned now" figure={plan.cutFraction.finish} />
        </List>
      )}
    </>
  );
}
