import { type Href, Link } from 'expo-router';
import { type Ref } from 'react';
import { Pressable, StyleSheet, type Text, View } from 'react-native';

import { Icon } from '@/components/ui/icon';
import { SavedChip } from '@/components/ui/saved-chip';
import { size } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';

export interface BackLink {
  label: string;
  href: Href;
}

interface PageHeaderProps {
  title: string;
  chip: boolean;
  back: BackLink | undefined;
  titleRef: Ref<Text>;
}

/** Title of a page and the way back above it; the chip stands at the right of the first row. */
export function PageHeader({ title, chip, back, titleRef }: PageHeaderProps) {
  return (
    <View style={styles.header}>
      {back && (
        <View style={styles.row}>
          <Link href={back.href} asChild>
            <Pressable role="link" style={styles.back} testID="back">
              <Icon name="back" size={20} />
              <Txt style={styles.backWord}>{back.label}</Txt>
            </Pressable>
          </Link>
          {chip && <SavedChip />}
        </View>
      )}
      <View style={styles.row}>
        <Txt kind="display" heading={1} tabIndex={-1} ref={titleRef} style={styles.title}>
          {title}
        </Txt>
        {chip && !back && <SavedChip />}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  header: { paddingTop: 8, paddingBottom: 10, paddingHorizontal: 8 },
  back: {
    minHeight: size.touchMin,
    flexDirection: 'row',
    alignItems: 'center',
    gap: 4,
    paddingRight: 12,
    marginLeft: -6,
    borderRadius: 14,
  },
  backWord: { fontFamily: font.strong },
  row: {
    minHeight: 44,
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    columnGap: 12,
    rowGap: 6,
  },
  title: { flexShrink: 1, borderRadius: 6, marginHorizontal: -6, paddingHorizontal: 6 },
});
