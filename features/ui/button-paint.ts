import { StyleSheet } from 'react-native';

import { colors, radius, space, stroke, target } from './tokens';
import type { ColorRole } from './tokens';

export type ButtonKind = 'primary' | 'secondary' | 'quiet' | 'danger' | 'dangerFilled' | 'onEnamel';

interface Paint {
  ground: string;
  pressed: string;
  text: ColorRole;
  edge: string;
}

/** How each kind of button, and of link that looks like one, is painted. */
export const PAINTS: Record<ButtonKind, Paint> = {
  primary: {
    ground: colors.accent,
    pressed: colors.accentPressed,
    text: 'onAccent',
    edge: colors.accentEdge,
  },
  secondary: {
    ground: 'transparent',
    pressed: colors.hover,
    text: 'action',
    edge: colors.action,
  },
  quiet: { ground: 'transparent', pressed: colors.hover, text: 'action', edge: 'transparent' },
  danger: { ground: 'transparent', pressed: colors.stopTint, text: 'stop', edge: colors.stop },
  dangerFilled: {
    ground: colors.stop,
    pressed: colors.stopPressed,
    text: 'onStop',
    edge: colors.stop,
  },
  onEnamel: {
    ground: 'transparent',
    pressed: colors.headerWell,
    text: 'onEnamel',
    edge: colors.onEnamelSoft,
  },
};

export const buttonStyles = StyleSheet.create({
  button: {
    minHeight: target.base,
    minWidth: target.base,
    paddingHorizontal: space[4],
    paddingVertical: space[2],
    borderRadius: radius.control,
    borderWidth: stroke.control,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'center',
    gap: space[2],
  },
  machine: { minHeight: target.machine, paddingHorizontal: space[6] },
  wide: { alignSelf: 'stretch' },
  text: { textAlign: 'center', flexShrink: 1 },
});
