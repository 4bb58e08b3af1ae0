import Svg, { Circle, Path } from 'react-native-svg';

import { cautionPaths } from './caution-paths';
import type { CautionSubject } from './caution-paths';
import { colors } from './tokens';

interface CautionIconProps {
  subject: CautionSubject;
  size?: number;
}

/** The sign of a caution: a white drawing on the blue disc of what must be done. Words stand beside it. */
export function CautionIcon({ subject, size = 56 }: CautionIconProps) {
  return (
    <Svg width={size} height={size} viewBox="0 0 48 48" aria-hidden style={{ flexShrink: 0 }}>
      <Circle cx={24} cy={24} r={24} fill={colors.must} />
      <Path
        d={cautionPaths[subject]}
        fill="none"
        stroke={colors.onMust}
        strokeWidth={2.5}
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </Svg>
  );
}
