import { Link } from 'expo-router';
import type { Href } from 'expo-router';
import { Pressable, StyleSheet, Text } from 'react-native';

import { Icon } from './icon';
import type { IconName } from './icon-paths';
import { colors, radius, space, stroke, target, type } from './tokens';
import type { TextTone } from './text';

interface TextLinkProps {
  /** The words that are pressed; they say where they lead. */
  label: string;
  href: Href;
  tone?: Extract<TextTone, 'text' | 'action' | 'onEnamel'>;
  replace?: boolean;
}

/** A link inside or beside running words: underlined, the words' own size. */
export function TextLink({ label, href, tone = 'action', replace }: TextLinkProps) {
  return (
    <Link
      href={href}
      replace={replace}
      style={[type.body, styles.underlined, { color: colors[tone] }]}
    >
      {label}
    </Link>
  );
}

interface ButtonLinkProps {
  label: string;
  href: Href;
  kind?: 'primary' | 'secondary' | 'quiet' | 'onEnamel';
  icon?: IconName;
  wide?: boolean;
  replace?: boolean;
}

const LINK_PAINT = {
  primary: { ground: colors.accent, edge: colors.accentEdge, text: 'onAccent' },
  secondary: { ground: 'transparent', edge: colors.action, text: 'action' },
  quiet: { ground: 'transparent', edge: 'transparent', text: 'action' },
  onEnamel: { ground: 'transparent', edge: colors.onEnamelSoft, text: 'onEnamel' },
} as const;

/** Looks like a button, leads to another screen. */
export function ButtonLink({
  label,
  href,
  kind = 'secondary',
  icon,
  wide,
  replace,
}: ButtonLinkProps) {
  const paint = LINK_PAINT[kind];
  return (
    <Link href={href} replace={replace} asChild>
      <Pressable
        role="link"
        style={StyleSheet.flatten([
          styles.button,
          wide && styles.wide,
          { backgroundColor: paint.ground, borderColor: paint.edge },
        ])}
      >
        {icon ? <Icon name={icon} size={22} color={paint.text} /> : null}
        <Text style={[type.button, { color: colors[paint.text] }]}>{label}</Text>
      </Pressable>
    </Link>
  );
}

const styles = StyleSheet.create({
  underlined: { textDecorationLine: 'underline' },
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
  wide: { alignSelf: 'stretch' },
});
