import { Link, usePathname, useRouter, useSegments, type Href } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, Text, View } from 'react-native';

import { Place, type PlaceLink } from './place';
import { colors, measure, space, type } from './tokens';

interface RailPlace extends PlaceLink {
  /** The place holds every address that begins so. */
  holds: readonly string[];
}

interface RailProps {
  places: readonly RailPlace[];
  brand?: string;
  /** At the foot: the way to another shop. */
  foot?: ReactNode;
}

/** The places of the app at the left of a wide screen, beside every screen of the shop. */
export function Rail({ places, brand = 'Ringtrue', foot }: RailProps) {
  const path = usePathname();
  const router = useRouter();
  const segments: readonly string[] = useSegments();
  // From a screen over the tabs, back to the one copy of them; between tabs, sideways.
  const go = (href: Href) =>
    segments.includes('(tabs)') ? router.navigate(href) : router.dismissTo(href);
  const here = places.find(({ holds }) => holds.some((start) => path.startsWith(start)));
  return (
    <View role="navigation" aria-label="Places" style={styles.rail}>
      <Text style={[type.subheading, styles.brand]}>{brand}</Text>
      <View style={styles.places}>
        {places.map((place) => (
          <Link
            key={place.name}
            href={place.href}
            onPress={(event) => {
              event.preventDefault();
              go(place.href);
            }}
            asChild
          >
            <Place
              rail
              label={place.label}
              icon={place.icon}
              here={here ? here === place : place.name === places[0]?.name}
            />
          </Link>
        ))}
      </View>
      {foot}
    </View>
  );
}

const styles = StyleSheet.create({
  rail: { width: measure.rail, backgroundColor: colors.nav, paddingVertical: space[4] },
  brand: { color: colors.onEnamel, textAlign: 'center', paddingVertical: space[3] },
  places: { flexGrow: 1 },
});
