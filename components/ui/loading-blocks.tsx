import { useEffect, useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { border, radius, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';

const SHOWN_AFTER_MS = 300;
const ROWS = [190, 220, 150, 200];

/** Still blocks in a page's shape, shown when waiting takes longer than 0.3 s. */
export function LoadingBlocks({ label }: { label: string }) {
  const { color } = useTheme();
  const [late, setLate] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setLate(true), SHOWN_AFTER_MS);
    return () => clearTimeout(timer);
  }, []);
  if (!late) return null;
  const line = { backgroundColor: color.line };
  const sunk = { backgroundColor: color.sunk };
  return (
    <View aria-busy>
      <View style={[styles.hero, sunk]} aria-hidden>
        <View style={[styles.block, line, { width: 90, height: 16 }]} />
        <View style={[styles.block, line, { width: 160, height: 30 }]} />
        <View style={[styles.block, line, { width: 130, height: 30 }]} />
        <View style={[styles.block, line, { width: 230, height: 18, marginTop: 40 }]} />
      </View>
      <Txt color="ink2" live="polite" style={styles.label}>
        {label}
      </Txt>
      <View aria-hidden>
        {ROWS.map((width) => (
          <View
            key={width}
            style={[styles.row, { backgroundColor: color.card, borderColor: color.line }]}
          >
            <View style={[styles.badge, sunk]} />
            <View style={styles.words}>
              <View style={[styles.block, sunk, { width: 70, height: 14 }]} />
              <View style={[styles.block, sunk, { width, height: 14 }]} />
            </View>
          </View>
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  hero: { borderRadius: radius.hero, padding: 22, gap: 12, minHeight: 200 },
  block: { borderRadius: 8, maxWidth: '100%' },
  label: { paddingHorizontal: 8, paddingVertical: 12, fontSize: 17 },
  row: {
    minHeight: 60,
    borderTopWidth: border.hair,
    paddingHorizontal: 12,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 12,
  },
  badge: { width: 44, height: 44, borderRadius: 13 },
  words: { flex: 1, gap: 8 },
});
