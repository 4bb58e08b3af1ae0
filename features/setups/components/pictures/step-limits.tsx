import { scaleLinear } from 'd3-scale';
import { StyleSheet, View } from 'react-native';

import { ChoiceList } from '@/features/ui/choice-list';
import { Engraved, NumeralSmall, Small, Strong } from '@/features/ui/text';
import { colors, space } from '@/features/ui/tokens';
import { useLayout } from '@/features/ui/use-layout';
import type { UnitSystem } from '@/shared/domain/people';
import type { BeltStepPlan, Plan } from '@/shared/rules/types';

import { limitWords, lockedBecause, stepRpm, stepSpeed, stepSpoken } from './step-words';

interface StepLimitsProps {
  speed: Plan['speed'];
  limits: Plan['limits'];
  units: UnitSystem;
  /** Called with the step's id; left out where the plan is only read. */
  onChoose?: (stepId: string) => void;
}

/** The belt steps as rows to choose from, their bars on one scale with the limit that governs. */
export function StepLimits({ speed, limits, units, onChoose }: StepLimitsProps) {
  const limitRpm = limits.governing?.rpm.value ?? null;
  const fastest = Math.max(1, limitRpm ?? 0, ...speed.steps.map((step) => step.rpm.value ?? 0));
  const share = scaleLinear()
    .domain([0, fastest * 1.06])
    .range([0, 100]);
  const limitAt = limitRpm === null ? null : share(limitRpm);
  return (
    <View>
      <View style={styles.head}>
        <Engraved>Belt step</Engraved>
        <Strong tone={limitRpm === null ? 'textSoft' : 'stop'} align="right" flex={1}>
          {limitWords(limits.governing, units)}
        </Strong>
      </View>
      <ChoiceList
        label="Belt step"
        value={speed.chosen}
        readOnly={onChoose === undefined}
        onChange={(id) => onChoose?.(id)}
        options={speed.steps.map((step) => {
          const reason = lockedBecause(step, limits.governing, units);
          return {
            value: step.id,
            locked: step.allowed === false,
            spoken: stepSpoken(step, reason, units),
            face: (
              <StepFace
                step={step}
                units={units}
                reason={reason}
                barShare={share(step.rpm.value ?? 0)}
                limitAt={limitAt}
              />
            ),
          };
        })}
      />
    </View>
  );
}

interface StepFaceProps {
  step: BeltStepPlan;
  units: UnitSystem;
  reason: string | null;
  /** Where the bar ends and the limit stands, in percent of the scale. */
  barShare: number;
  limitAt: number | null;
}

function StepFace({ step, units, reason, barShare, limitAt }: StepFaceProps) {
  const { cramped } = useLayout();
  const locked = reason !== null;
  const remark = step.actsSoft && !locked ? ' · acts soft' : '';
  return (
    <View style={[styles.face, cramped && styles.faceCramped]}>
      <View style={styles.name}>
        <NumeralSmall>{step.name}</NumeralSmall>
      </View>
      <View style={styles.words}>
        <Strong tone={locked ? 'stop' : 'text'}>{stepRpm(step, units)}</Strong>
        <Small tone={locked ? 'stop' : 'textSoft'}>{`${stepSpeed(step, units)}${remark}`}</Small>
        {locked ? <Small tone="stop">{reason}</Small> : null}
      </View>
      <View aria-hidden style={[styles.scale, cramped && styles.scaleCramped]}>
        <View style={styles.track}>
          <View
            style={[
              styles.bar,
              { width: `${barShare}%`, backgroundColor: locked ? colors.stop : colors.bar },
            ]}
          />
        </View>
        {limitAt === null ? null : <View style={[styles.limit, { left: `${limitAt}%` }]} />}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  head: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'baseline',
    columnGap: space[3],
    paddingHorizontal: space[4],
    paddingVertical: space[2],
  },
  face: { flexDirection: 'row', flexGrow: 1, flexShrink: 1, minWidth: 0, gap: space[3] },
  faceCramped: { flexWrap: 'wrap', rowGap: 0 },
  name: { minWidth: 20, justifyContent: 'center' },
  words: {
    flexGrow: 1,
    flexShrink: 1,
    flexBasis: 120,
    minWidth: 0,
    justifyContent: 'center',
    paddingVertical: space[2],
  },
  scale: { width: '40%', maxWidth: 420, justifyContent: 'center' },
  scaleCramped: { width: '100%', maxWidth: '100%', minHeight: 28 },
  track: { height: 12, backgroundColor: colors.well },
  bar: { height: 12 },
  limit: {
    position: 'absolute',
    top: 0,
    bottom: 0,
    width: 2,
    marginLeft: -1,
    backgroundColor: colors.stop,
  },
});
