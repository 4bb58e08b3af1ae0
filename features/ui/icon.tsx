import Svg, { Circle, Path, Polygon } from 'react-native-svg';

import { icons } from './icon-paths';
import type { IconName } from './icon-paths';
import { colors } from './tokens';
import type { ColorRole } from './tokens';

interface IconProps {
  name: IconName;
  /** Height and width in pixels. */
  size?: number;
  color?: ColorRole;
}

/** A drawn sign, one weight. Always beside a word or inside a control that has a label. */
export function Icon({ name, size = 24, color = 'text' }: IconProps) {
  return (
    <Svg width={size} height={size} viewBox="0 0 24 24" aria-hidden style={WHOLE}>
      <Path
        d={icons[name]}
        fill="none"
        stroke={colors[color]}
        strokeWidth={1.75}
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </Svg>
  );
}

// Beside long words a drawing keeps its size.
const WHOLE = { flexShrink: 0 } as const;

export type VerdictShape = 'incomplete' | 'clear' | 'check' | 'stop';

/** The shape that stands beside a verdict's word: ring, disc, triangle, octagon. */
export function VerdictIcon({ verdict, size = 24 }: { verdict: VerdictShape; size?: number }) {
  return (
    <Svg width={size} height={size} viewBox="0 0 24 24" aria-hidden style={WHOLE}>
      {verdict === 'incomplete' ? (
        <Circle cx={12} cy={12} r={9} fill="none" stroke={colors.outline} strokeWidth={2.5} />
      ) : null}
      {verdict === 'clear' ? (
        <>
          <Circle cx={12} cy={12} r={10.5} fill={colors.fit} />
          <Path
            d="M7.2 12.4l3.2 3.2 6.4-6.8"
            fill="none"
            stroke={colors.onFit}
            strokeWidth={2.2}
            strokeLinecap="round"
            strokeLinejoin="round"
          />
        </>
      ) : null}
      {verdict === 'check' ? (
        <>
          <Path
            d="M12 2.6 22.4 21H1.6z"
            fill={colors.warn}
            stroke={colors.onWarn}
            strokeWidth={1.5}
            strokeLinejoin="round"
          />
          <Path
            d="M12 9.2v5.4M12 17.6v.2"
            stroke={colors.onWarn}
            strokeWidth={2.2}
            strokeLinecap="round"
          />
        </>
      ) : null}
      {verdict === 'stop' ? (
        <>
          <Polygon
            points="7.4,1 16.6,1 23,7.4 23,16.6 16.6,23 7.4,23 1,16.6 1,7.4"
            fill={colors.stop}
          />
          <Path d="M6.5 12h11" stroke={colors.onStop} strokeWidth={3.4} />
        </>
      ) : null}
    </Svg>
  );
}
