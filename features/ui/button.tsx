import { Pressable, StyleSheet, Text, View } from 'react-native';
import type { Role } from 'react-native';

import { buttonStyles, PAINTS } from './button-paint';
import type { ButtonKind } from './button-paint';
import { Icon } from './icon';
import type { IconName } from './icon-paths';
import { colors, radius, stroke, target, type } from './tokens';
import type { ColorRole } from './tokens';

export interface ButtonProps {
  /** What it does, in words; also what is spoken. */
  label: string;
  onPress?: () => void;
  /** Primary is brass, and stands once on a screen. */
  kind?: ButtonKind;
  icon?: IconName;
  /** Spoken instead of the label where the words alone are not enough: "Change the wheel". */
  spoken?: string;
  /** Machine is 64 px, for hands at the running lathe. */
  size?: 'base' | 'machine';
  /** Takes the full width of its row. */
  wide?: boolean;
  /** Shows that the action is under way, and refuses a second press. */
  busy?: boolean;
  /** Only while the action is impossible; never for invalid input. */
  disabled?: boolean;
  /** For actions that open and close something: id of the part, and whether it is open. */
  controls?: string;
  expanded?: boolean;
  id?: string;
  role?: Extract<Role, 'button' | 'link' | 'tab' | 'switch' | 'menuitem'>;
}

/** A button: at least 48 px high, pressed state, focus ring, busy state. */
export function Button({
  label,
  onPress,
  kind = 'secondary',
  icon,
  spoken,
  size = 'base',
  wide = false,
  busy = false,
  disabled = false,
  controls,
  expanded,
  id,
  role = 'button',
}: ButtonProps) {
  const paint = PAINTS[kind];
  return (
    <Pressable
      id={id}
      role={role}
      aria-label={spoken}
      aria-busy={busy || undefined}
      aria-expanded={expanded}
      {...(controls === undefined ? null : { 'aria-controls': controls })}
      disabled={disabled}
      onPress={busy ? undefined : onPress}
      style={({ pressed, hovered }: { pressed: boolean; hovered?: boolean }) => [
        buttonStyles.button,
        size === 'machine' && buttonStyles.machine,
        wide && buttonStyles.wide,
        {
          backgroundColor: pressed || hovered ? paint.pressed : paint.ground,
          borderColor: paint.edge,
        },
        disabled && styles.off,
      ]}
    >
      {icon ? <Icon name={icon} size={size === 'machine' ? 28 : 22} color={paint.text} /> : null}
      <Text
        style={[
          size === 'machine' ? type.buttonLarge : type.button,
          buttonStyles.text,
          { color: colors[paint.text] },
        ]}
      >
        {label}
      </Text>
      {busy ? <View style={[styles.busy, { borderColor: colors[paint.text] }]} /> : null}
    </Pressable>
  );
}

interface IconButtonProps {
  /** Spoken, and shown as the tooltip; the sign stands alone. */
  label: string;
  icon: IconName;
  onPress: () => void;
  color?: ColorRole;
  disabled?: boolean;
}

/** A sign of its own, 48 px square, for places where every pixel counts: back, close, undo. */
export function IconButton({ label, icon, onPress, color = 'text', disabled }: IconButtonProps) {
  return (
    <Pressable
      role="button"
      aria-label={label}
      disabled={disabled}
      onPress={onPress}
      style={({ pressed }) => [styles.icon, (pressed || disabled) && styles.off]}
    >
      <Icon name={icon} color={color} />
    </Pressable>
  );
}

const styles = StyleSheet.create({
  off: { opacity: 0.55 },
  busy: { width: 10, height: 10, borderRadius: 5, borderWidth: stroke.heavy },
  icon: {
    width: target.base,
    height: target.base,
    borderRadius: radius.control,
    alignItems: 'center',
    justifyContent: 'center',
  },
});
