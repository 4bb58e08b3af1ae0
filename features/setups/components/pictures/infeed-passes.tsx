import { scaleLinear } from 'd3-scale';
import { curveStepBefore, line } from 'd3-shape';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { G, Line, Path, Rect } from 'react-native-svg';

import { Picture, PictureText, wordsWidth } from '@/features/ui/picture';
import { Small } from '@/features/ui/text';
import { colors, space } from '@/features/ui/tokens';
import type { UnitSystem } from '@/shared/domain/people';
import type { Pass } from '@/shared/rules/types';
import { convertUnit, displayUnit, ENTRY_UNITS } from '@/shared/units/entry-units';

import { isFinish } from './pass-groups';
import { PassTable } from './pass-table';

interface InfeedPassesProps {
  passes: readonly Pass[];
  units: UnitSystem;
}

const TICKS = 4;
const DASH = '6 4';

/** Infeed, pass by pass: what the dial still has to go against the metal still to come off. */
export function InfeedPasses({ passes, units }: InfeedPassesProps) {
  const first = passes[0];
  if (!first) return null;
  return (
    <View style={styles.view}>
      <Key unit={ENTRY_UNITS[displayUnit('mm', units)].label} />
      <PassCurves passes={passes} first={first} units={units} />
      <PassTable passes={passes} units={units} />
    </View>
  );
}

interface PassCurvesProps extends InfeedPassesProps {
  first: Pass;
}

function PassCurves({ passes, first, units }: PassCurvesProps) {
  const shown = (valueMm: number) => convertUnit(valueMm, 'mm', displayUnit('mm', units));
  const steps = (start: number, rest: (pass: Pass) => number): [number, number][] => [
    [0, shown(start)],
    ...passes.map((pass): [number, number] => [pass.number, shown(rest(pass))]),
  ];
  const dial = steps(first.dialToGoMm + first.infeedMm, (pass) => pass.dialToGoMm);
  const metal = steps(first.metalToGoMm + first.cutMm, (pass) => pass.metalToGoMm);
  const most = Math.max(...[...dial, ...metal].map(([, value]) => value));
  const finish = passes.find((pass) => isFinish(pass.stage));
  const last = passes.length;
  const y = scaleLinear().domain([0, most]).nice(TICKS);
  const ticks = y.ticks(TICKS);
  const tickWords = y.tickFormat(TICKS);

  return (
    <Picture
      height={(width) => Math.min(Math.max(width * 0.5, 170), 260)}
      description={`Over ${last} passes the dial goes down in even steps, and the metal follows behind it.`}
    >
      {({ width, height, textScale }) => {
        const left =
          8 + Math.max(...ticks.map((tick) => wordsWidth(tickWords(tick), 'small', textScale)));
        const bottom = height - 38 * textScale;
        const x = scaleLinear()
          .domain([0, last])
          .range([left, width - 2]);
        const drop = y.copy().range([bottom, 10]);
        const path = line<[number, number]>()
          .x(([pass]) => x(pass))
          .y(([, value]) => drop(value))
          .curve(curveStepBefore);
        const start = finish ? x(finish.number - 1) : null;
        const baseline = bottom + 16 * textScale;
        return (
          <>
            {start === null ? null : (
              <Rect
                x={start}
                y={drop.range()[1]}
                width={x(last) - start}
                height={bottom - 10}
                fill={colors.well}
              />
            )}
            {ticks.map((tick) => (
              <G key={tick}>
                <Line x1={left} x2={width} y1={drop(tick)} y2={drop(tick)} stroke={colors.rule} />
                <PictureText
                  x={left - 6}
                  y={drop(tick) + 4 * textScale}
                  anchor="end"
                  size="small"
                  color="textSoft"
                  textScale={textScale}
                >
                  {tickWords(tick)}
                </PictureText>
              </G>
            ))}
            <Path d={path(dial) ?? ''} fill="none" stroke={colors.bar} strokeWidth={3} />
            <Path
              d={path(metal) ?? ''}
              fill="none"
              stroke={colors.spark}
              strokeWidth={2.5}
              strokeDasharray={DASH}
            />
            <PictureText x={left} y={baseline} size="small" color="textSoft" textScale={textScale}>
              pass 1
            </PictureText>
            <PictureText
              x={width - 2}
              y={baseline}
              anchor="end"
              size="small"
              color="textSoft"
              textScale={textScale}
            >
              {`pass ${last}`}
            </PictureText>
            {start !== null && start > left ? (
              <DressMark x={start} top={bottom} width={width} left={left} textScale={textScale} />
            ) : null}
          </>
        );
      }}
    </Picture>
  );
}

interface DressMarkProps {
  x: number;
  top: number;
  left: number;
  width: number;
  textScale: number;
}

/** Where the wheel is dressed between rough and finish; on a line of its own, clear of the pass numbers. */
function DressMark({ x, top, left, width, textScale }: DressMarkProps) {
  const words = 'dress, touch off';
  const half = wordsWidth(words, 'small', textScale) / 2;
  const middle = Math.min(Math.max(x, left + half), width - half);
  return (
    <>
      <Line x1={x} x2={x} y1={top} y2={top + 20 * textScale} stroke={colors.outline} />
      <PictureText
        x={middle}
        y={top + 33 * textScale}
        anchor="middle"
        size="small"
        textScale={textScale}
      >
        {words}
      </PictureText>
    </>
  );
}

/** Names the two lines and the shaded part. */
function Key({ unit }: { unit: string }) {
  return (
    <View style={styles.key}>
      <View style={styles.entry}>
        <Sample>
          <Line x1={0} x2={28} y1={6} y2={6} stroke={colors.bar} strokeWidth={3} />
        </Sample>
        <View style={styles.words}>
          <Small tone="text">{`dial still to go, ${unit}`}</Small>
        </View>
      </View>
      <View style={styles.entry}>
        <Sample>
          <Line
            x1={0}
            x2={28}
            y1={6}
            y2={6}
            stroke={colors.spark}
            strokeWidth={2.5}
            strokeDasharray={DASH}
          />
        </Sample>
        <View style={styles.words}>
          <Small tone="sparkText">{`metal still to come off, ${unit}`}</Small>
        </View>
      </View>
      <View style={styles.entry}>
        <Sample>
          <Rect x={0} y={0} width={28} height={12} fill={colors.well} stroke={colors.rule} />
        </Sample>
        <Small tone="text">finish</Small>
      </View>
    </View>
  );
}

function Sample({ children }: { children: ReactNode }) {
  return (
    <Svg width={28} height={12} aria-hidden>
      {children}
    </Svg>
  );
}

const styles = StyleSheet.create({
  view: { gap: space[3] },
  key: { flexDirection: 'row', flexWrap: 'wrap', columnGap: space[4], rowGap: space[1] },
  entry: { flexDirection: 'row', alignItems: 'center', flexShrink: 1, gap: space[2] },
  words: { flexShrink: 1 },
});
