import { Link } from 'expo-router';
import type { Href } from 'expo-router';
import { Pressable, StyleSheet, Text } from 'react-native';

import { buttonStyles, PAINTS } from './button-paint';
import type { ButtonKind } from './button-paint';
import { Icon } from './icon';
import type { IconName } from './icon-paths';
import { colors, type } from './tokens';
import type { TextTone } from './text';

interface TextLinkProps {
  /** The words that are pressed; they say where they lead. */
  label: string;
  href: Href;
  tone?: Extract<TextTone, 'text' | 'action' | 'onEnamel'>;
  replace?: boolean;
  /** What else happens when it is pressed: a sheet closes. */
  onPress?: () => void;
}

/** A link inside or beside running words: underlined, the words' own size. */
export function TextLink({ label, href, tone = 'action', replace, onPress }: TextLinkProps) {
  return (
    <Link
      href={href}
      replace={replace}
      onPress={onPress}
      style={[type.body, styles.underlined, { color: colors[tone] }]}
    >
      {label}
    </Link>
  );
}

interface ButtonLinkProps {
  label: string;
  href: Href;
  kind?: Extract<ButtonKind, 'primary' | 'secondary' | 'quiet' | 'onEnamel'>;
  icon?: IconName;
  wide?: boolean;
  replace?: boolean;
}

/** Looks like a button, leads to another screen. */
export function ButtonLink({
  label,
  href,
  kind = 'secondary',
  icon,
  wide,
  replace,
}: ButtonLinkProps) {
  const paint = PAINTS[kind];
  return (
    <Link href={href} replace={replace} asChild>
      <Pressable
        role="link"
        style={StyleSheet.flatten([
          buttonStyles.button,
          wide && buttonStyles.wide,
          { backgroundColor: paint.ground, borderColor: paint.edge },
        ])}
      >
        {icon ? <Icon name={icon} size={22} color={paint.text} /> : null}
        <Text style={[type.button, buttonStyles.text, { color: colors[paint.text] }]}>{label}</Text>
      </Pressable>
    </Link>
  );
}

const styles = StyleSheet.create({
  underlined: { textDecorationLine: 'underline' },
});
