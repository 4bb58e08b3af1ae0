import { StyleSheet, View } from 'react-native';
import { Circle, G, Line, Path } from 'react-native-svg';

import { Picture, PictureText } from '@/features/ui/picture';
import { polar } from '@/features/ui/polar';
import { Small } from '@/features/ui/text';
import { colors, space } from '@/features/ui/tokens';
import type { UnitSystem } from '@/shared/domain/people';
import type { Reading, RunoutFit } from '@/shared/rules/runout';
import { formatQuantity } from '@/shared/units/format';

import { dialLayout, dialMarks, TICKS_DEG, type DialLayout } from './dial-geometry';

interface RunOutDialProps {
  /** Rising as the surface stands further from the axis. */
  readings: readonly Reading[];
  fit: RunoutFit | null;
  units: UnitSystem;
}

const WIDEST = 320;

/** Readings round the clock, the circle fitted through them, and its high spot. */
export function RunOutDial({ readings, fit, units }: RunOutDialProps) {
  return (
    <View style={styles.view}>
      <View style={styles.middle}>
        <Picture
          maxWidth={WIDEST}
          height={(width, textScale) => dialLayout(width, textScale).height}
          description={`Dial with ${readings.length} readings${fit ? ', the circle fitted through them and its high spot' : ''}; the sentence below says what they show.`}
        >
          {({ width, textScale }) => {
            const layout = dialLayout(width, textScale);
            return (
              <>
                <Face layout={layout} textScale={textScale} />
                <Marks readings={readings} fit={fit} layout={layout} />
              </>
            );
          }}
        </Picture>
      </View>
      <Small tone="text">{dialWords(readings, fit, units)}</Small>
      <Small>Angles run clockwise here; readings are enlarged to fill the dial.</Small>
    </View>
  );
}

function Face({ layout, textScale }: { layout: DialLayout; textScale: number }) {
  const { centre, radius, baseRadius } = layout;
  return (
    <>
      <Circle cx={centre.x} cy={centre.y} r={radius} fill={colors.well} stroke={colors.rule} />
      <Circle
        cx={centre.x}
        cy={centre.y}
        r={baseRadius}
        fill="none"
        stroke={colors.outline}
        strokeDasharray="3 5"
      />
      {TICKS_DEG.map((angleDeg) => {
        const long = angleDeg % 90 === 0;
        const inner = polar(centre, radius - (long ? 12 : 7), angleDeg);
        const outer = polar(centre, radius, angleDeg);
        const words = polar(centre, radius + 15 * textScale, angleDeg);
        return (
          <G key={angleDeg}>
            <Line
              x1={inner.x}
              y1={inner.y}
              x2={outer.x}
              y2={outer.y}
              stroke={colors.text}
              strokeWidth={long ? 2.5 : 1.5}
            />
            {long || textScale < 1.5 ? (
              <PictureText
                x={words.x}
                y={words.y + 4.5 * textScale}
                anchor="middle"
                size="small"
                color="textSoft"
                textScale={textScale}
              >
                {String(angleDeg)}
              </PictureText>
            ) : null}
          </G>
        );
      })}
    </>
  );
}

function Marks({ readings, fit, layout }: Omit<RunOutDialProps, 'units'> & { layout: DialLayout }) {
  const { centre } = layout;
  const { points, circle, hand } = dialMarks(readings, fit, layout);
  return (
    <>
      {circle === null ? null : (
        <G x={centre.x} y={centre.y}>
          <Path d={circle} fill="none" stroke={colors.metal} strokeWidth={3} />
        </G>
      )}
      {hand ? (
        <Line
          x1={centre.x}
          y1={centre.y}
          x2={hand.x}
          y2={hand.y}
          stroke={colors.mark}
          strokeWidth={3.5}
        />
      ) : null}
      <Circle cx={centre.x} cy={centre.y} r={4} fill={colors.metalEdge} />
      {points.map(({ x, y }, index) => (
        <Circle key={index} cx={x} cy={y} r={6} fill={colors.metalEdge} stroke={colors.well} />
      ))}
    </>
  );
}

/** The dial in words: the span of the readings, and where their circle stands. */
function dialWords(readings: readonly Reading[], fit: RunoutFit | null, units: UnitSystem): string {
  const sorted = [...readings].sort((one, other) => one.readingMm - other.readingMm);
  const [lowest, highest] = [sorted[0], sorted.at(-1)];
  if (!lowest || !highest) return 'No readings yet.';
  const at = ({ angleDeg, readingMm }: Reading) =>
    `${formatQuantity({ value: readingMm, unit: 'mm' }, units, { fixed: true })} at ${degrees(angleDeg)}`;
  const span = `${readings.length} ${readings.length === 1 ? 'reading' : 'readings'}, lowest ${at(lowest)}, highest ${at(highest)}.`;
  const off = fit?.eccentricity.value ?? null;
  if (!fit || off === null) return span;
  const offWords = formatQuantity({ value: off, unit: 'mm' }, units, { fixed: true });
  return `${span} The fitted circle stands ${offWords} off the axis, highest at ${degrees(fit.highSpotDeg)}.`;
}

const degrees = (value: number) => formatQuantity({ value, unit: 'deg' }, 'mm', { digits: 0 });

const styles = StyleSheet.create({
  view: { gap: space[2] },
  middle: { alignSelf: 'center', width: '100%', maxWidth: WIDEST },
});
