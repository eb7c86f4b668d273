import { Link } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';

import { type PLACES, type Place } from '@/components/shell/places';
import { Icon } from '@/components/ui/icon';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { webOnly } from '@/components/ui/web-only';

interface PlaceLinkProps {
  link: (typeof PLACES)[number];
  here: Place;
  rail?: boolean | undefined;
}

/** One place of the bar or the rail: a sign in a pill over its word. */
export function PlaceLink({ link, here, rail = false }: PlaceLinkProps) {
  const { color } = useTheme();
  const on = link.place === here;
  return (
    <Link href={link.href} asChild>
      <Pressable
        role="link"
        style={rail ? styles.rail : styles.bar}
        testID={`place-${link.place}`}
        {...webOnly({ 'aria-current': on ? 'page' : undefined })}
      >
        <View style={[styles.pip, on && { backgroundColor: color.action }]}>
          <Icon name={link.icon} size={24} color={on ? 'onAction' : 'ink2'} />
        </View>
        <Txt kind="nav" color={on ? 'ink' : 'ink2'} style={on ? styles.on : null}>
          {link.name}
        </Txt>
      </Pressable>
    </Link>
  );
}

const styles = StyleSheet.create({
  bar: {
    flex: 1,
    minHeight: 56,
    borderRadius: 16,
    alignItems: 'center',
    justifyContent: 'center',
    gap: 3,
  },
  rail: {
    width: 80,
    minHeight: 66,
    borderRadius: 16,
    alignItems: 'center',
    justifyContent: 'center',
    gap: 3,
  },
  pip: { width: 58, height: 32, borderRadius: 16, alignItems: 'center', justifyContent: 'center' },
  on: { fontFamily: font.bold },
});
