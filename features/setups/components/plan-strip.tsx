import { useEffect, useRef, useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { FigureReadout } from '@/features/plan';
import { Small } from '@/features/ui/text';
import { colors, space } from '@/features/ui/tokens';
import { VerdictBadge } from '@/features/ui/verdict';
import type { Figure, Plan } from '@/shared/rules';
import type { FormatOptions } from '@/shared/units/format';

import { verdictCount } from '../verdict-count';
import { useKeyboardUp } from './use-keyboard-up';

interface StripFigure {
  label: string;
  figure: Figure;
  options?: FormatOptions;
}

const stripFigures = ({ speed, work, stock, time }: Plan): StripFigure[] => [
  { label: 'Wheel', figure: speed.wheelSpeed },
  { label: 'Work', figure: work.latheRpm },
  { label: 'Stock', figure: stock, options: { rounding: 'up' } },
  { label: 'Time', figure: time.total, options: { digits: 0, rounding: 'up' } },
];

interface PlanStripProps {
  plan: Plan;
  onVerdict: () => void;
}

/** At the bottom of a phone: the verdict and the four figures that matter; less while the keyboard is up. */
export function PlanStrip({ plan, onVerdict }: PlanStripProps) {
  const keyboardUp = useKeyboardUp();
  const figures = stripFigures(plan);
  const changed = useLastChanged(figures.map(({ figure }) => figure.value));
  const badge = (
    <VerdictBadge
      verdict={plan.verdict}
      count={verdictCount(plan)}
      onPress={onVerdict}
      pressHint="show the findings"
      size={keyboardUp ? 'small' : 'base'}
    />
  );
  const shown = figures[changed];
  if (keyboardUp)
    return (
      <View role="region" aria-label="Plan" style={[styles.strip, styles.low]}>
        {badge}
        {shown ? <FigureReadout {...shown} size="small" on="enamel" /> : null}
      </View>
    );
  return (
    <View role="region" aria-label="Plan" style={styles.strip}>
      <View style={styles.top}>
        {badge}
        <Small tone="onEnamelSoft">tap a figure for its working</Small>
      </View>
      <View style={styles.figures}>
        {figures.map((figure) => (
          <FigureReadout key={figure.label} {...figure} size="small" on="enamel" />
        ))}
      </View>
    </View>
  );
}

/** Index of the value that changed last. */
function useLastChanged(values: readonly (number | null)[]): number {
  const before = useRef(values);
  const [last, setLast] = useState(0);
  useEffect(() => {
    const index = values.findIndex((value, place) => value !== before.current[place]);
    before.current = values;
    if (index >= 0) setLast(index);
  }, [values]);
  return last;
}

const styles = StyleSheet.create({
  strip: {
    backgroundColor: colors.nav,
    paddingHorizontal: space[4],
    paddingTop: space[1],
    paddingBottom: space[1],
  },
  low: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between' },
  top: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between' },
  figures: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between' },
});
