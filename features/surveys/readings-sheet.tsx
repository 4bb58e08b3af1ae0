import { useState } from 'react';

import { draftKey, readDraft, useLocalDraft } from '@/features/forms';
import { FigureReadout, figureText, PlanReader, useReader } from '@/features/plan';
import { useShop } from '@/features/session';
import { Button } from '@/features/ui/button';
import { Stack } from '@/features/ui/card';
import { Field } from '@/features/ui/field';
import { Fold } from '@/features/ui/fold';
import { Notice } from '@/features/ui/notice';
import { Readout, ReadoutRow } from '@/features/ui/readout';
import { Segmented } from '@/features/ui/segmented';
import { Sheet } from '@/features/ui/sheet';
import { Small } from '@/features/ui/text';
import { UNIT_SYSTEMS, type UnitSystem } from '@/shared/domain/people';
import { SIDES, type Side } from '@/shared/domain/setups';
import { fitRunout, type RunoutFit } from '@/shared/rules/runout';
import { unitLabel } from '@/shared/units/entry-units';
import { formatQuantity } from '@/shared/units/format';

import { readReadings, seenFromOutside, SPREADS, type Spread } from './readings';
import { RunOutDial } from './run-out-dial';

/** What the readings say of one plane, rounded as it is shown: texts to put into fields, in the person's units. */
export interface ReadingsResult {
  plane: string;
  runOut: string;
  highSpot: string;
}

interface ReadingsSheetProps {
  open: boolean;
  onClose: () => void;
  /** Where the readings were taken; one plane needs no choice. */
  planes: readonly { id: string; label: string }[];
  /** Which side of the surface the indicator usually touches here. */
  side: Side;
  /** From where angles are counted, and which way. */
  counting: string;
  /** Round work must clean up all that was read; a plan of jaws wants the offset alone. */
  uses: 'offset' | 'whole swing';
  /** Under this name what was typed stays on the device. */
  keptAs: string;
  onUse: (result: ReadingsResult) => void;
}

interface Typed {
  plane: string;
  texts: Record<string, string>;
  units: UnitSystem;
  spread: Spread;
  side: Side;
}

const SIDE_WORDS: Record<Side, string> = { outside: 'from outside', inside: 'inside a bore' };

/** Indicator readings typed as a list: eccentricity, run-out, high spot and roundness come out of it live. */
export function ReadingsSheet({ open, onClose, ...props }: ReadingsSheetProps) {
  const { shop, person, units } = useShop();
  const key = draftKey(person.personId, shop.id, props.keptAs);
  const [typed, setTyped] = useState<Typed>(
    () =>
      readDraft(key, isTyped)?.values ?? firstTyped(props.planes[0]?.id ?? '', props.side, units),
  );
  useLocalDraft(key, { values: typed, version: null }, Object.keys(typed.texts).length > 0);
  // A list stays in the units it was begun in; only an empty one follows the person's.
  const listUnits = isEmpty(typed) ? units : typed.units;
  const text = typed.texts[typed.plane] ?? '';
  const { readings, faults, nextDeg } = readReadings(text, listUnits, typed.spread);
  const seen = seenFromOutside(readings, typed.side === 'inside');
  const fit = faults.length === 0 ? fitRunout(seen) : null;
  const result = fit ? resultOf(fit, props.uses) : null;
  const used = result && {
    plane: typed.plane,
    runOut: formatQuantity({ value: result.runOutMm, unit: 'mm' }, units, {
      rounding: 'up',
      withUnit: false,
    }),
    highSpot: formatQuantity({ value: result.highSpotDeg, unit: 'deg' }, units, {
      digits: 0,
      withUnit: false,
    }),
  };
  return (
    <Sheet
      open={open}
      onClose={onClose}
      title="From indicator readings"
      footer={
        used ? (
          <Button
            label={
              props.uses === 'offset'
                ? `Use ${used.runOut} ${unitLabel('mm', units)} at ${used.highSpot}°`
                : `Use ${used.runOut} ${unitLabel('mm', units)}`
            }
            kind="primary"
            wide
            onPress={() => {
              props.onUse(used);
              onClose();
            }}
          />
        ) : null
      }
    >
      {/* Of its own, so that a working opens over this sheet. */}
      <PlanReader units={units}>
        <Stack>
          {props.planes.length > 1 ? (
            <Segmented
              name="readings.plane"
              label="Plane"
              options={props.planes.map(({ id, label }) => ({ value: id, label }))}
              value={typed.plane}
              onChange={(plane) => setTyped({ ...typed, plane })}
            />
          ) : null}
          <Field
            name="readings.text"
            label="Readings"
            lines={4}
            unit={unitLabel('mm', listUnits)}
            hint={`One to a line, or with semicolons between: they are spread evenly over the turn from 0°. Or each with its angle, like 30: 0.02. ${props.counting}`}
            error={faults[0]}
            value={text}
            onChangeText={(next) =>
              setTyped({
                ...typed,
                units: listUnits,
                texts: { ...typed.texts, [typed.plane]: next },
              })
            }
          />
          {nextDeg === null ? null : (
            <Small tone="text">{`Next reading at ${formatQuantity({ value: nextDeg, unit: 'deg' }, units, { digits: 0 })}.`}</Small>
          )}
          <Fold label="How they were taken" value={takenWords(typed)}>
            <Segmented
              name="readings.spread"
              label="Readings in one turn"
              options={SPREADS.map((value) => ({ value, label: value }))}
              value={typed.spread}
              onChange={(spread) => setTyped({ ...typed, spread })}
            />
            <Segmented
              name="readings.side"
              label="The indicator touches the surface"
              hint="Inside a bore it rises where the wall comes nearer to the axis: the high spot is then on the other side."
              options={SIDES.map((value) => ({ value, label: SIDE_WORDS[value] }))}
              value={typed.side}
              onChange={(side) => setTyped({ ...typed, side })}
            />
          </Fold>
          {readings.length > 0 && typed.side === 'inside' ? (
            <Small>Signs are turned round below, as the indicator stood inside.</Small>
          ) : null}
          {readings.length > 0 ? <RunOutDial readings={seen} fit={fit} units={units} /> : null}
          <Fit fit={fit} count={readings.length} faulty={faults.length > 0} />
        </Stack>
      </PlanReader>
    </Sheet>
  );
}

function Fit({ fit, count, faulty }: { fit: RunoutFit | null; count: number; faulty: boolean }) {
  const { units } = useReader();
  if (faulty || count === 0) return null;
  if (!fit)
    return (
      <Notice>
        {count < 3
          ? 'A circle needs three readings; four or more also show how round the part is.'
          : 'These readings stand too close together to fit a circle. Spread them over the turn.'}
      </Notice>
    );
  return (
    <>
      <ReadoutRow>
        <FigureReadout size="small" label="Eccentricity" figure={fit.eccentricity} />
        <FigureReadout
          size="small"
          label="High spot"
          figure={fit.highSpot}
          options={{ digits: 0 }}
          value={figureText(fit.highSpot, units, { digits: 0 })}
          unit=""
        />
        <FigureReadout size="small" label="Run-out of the circle (TIR)" figure={fit.circleRunOut} />
        <FigureReadout size="small" label="Whole swing as read (TIR)" figure={fit.runOut} />
        <FigureReadout size="small" label="Out-of-round" figure={fit.outOfRound} />
        <FigureReadout size="small" label="Doubt in the eccentricity" figure={fit.uncertainty} />
        <Readout size="small" label="Readings" value={String(count)} />
      </ReadoutRow>
      {fit.outOfRound.value === null ? <Small>{fit.outOfRound.working.note}</Small> : null}
    </>
  );
}

/** The stricter of what was read and what the circle gives, where all of it must clean up. */
function resultOf(fit: RunoutFit, uses: ReadingsSheetProps['uses']) {
  const circle = fit.circleRunOut.value;
  const swing = fit.runOut.value;
  if (circle === null || swing === null) return null;
  return {
    runOutMm: uses === 'offset' ? circle : Math.max(circle, swing),
    highSpotDeg: fit.highSpotDeg,
  };
}

const firstTyped = (plane: string, side: Side, units: UnitSystem): Typed => ({
  plane,
  texts: {},
  units,
  spread: 'as typed',
  side,
});

const isEmpty = ({ texts }: Typed) => Object.values(texts).every((text) => text.trim() === '');

const takenWords = ({ spread, side }: Typed) =>
  `${spread === 'as typed' ? 'as many as typed' : `${spread} in a turn`}, ${SIDE_WORDS[side]}`;

/** Guards what comes back from the device's storage. */
function isTyped(value: unknown): value is Typed {
  if (typeof value !== 'object' || value === null) return false;
  const { plane, texts, units, spread, side } = value as Partial<Typed>;
  return (
    typeof plane === 'string' &&
    typeof texts === 'object' &&
    UNIT_SYSTEMS.some((known) => known === units) &&
    SPREADS.some((known) => known === spread) &&
    SIDES.some((known) => known === side)
  );
}
