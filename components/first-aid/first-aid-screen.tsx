import { router } from 'expo-router';
import { useRef } from 'react';
import { ScrollView, StyleSheet, type Text, View } from 'react-native';
import { useSafeAreaInsets } from 'react-native-safe-area-context';

import { FIRST_AID, FIRST_AID_SOURCES } from '@/components/first-aid/first-aid-lines';
import { usePageTitle } from '@/components/shell/use-page-title';
import { Button } from '@/components/ui/button';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';

/** `/first-aid`: what to do about a cut, large, from the device itself. */
export function FirstAidScreen() {
  const { color } = useTheme();
  const { top } = useSafeAreaInsets();
  const heading = useRef<Text>(null);
  usePageTitle('If someone is cut', heading);
  const back = () => {
    if (router.canGoBack()) router.back();
    else router.replace('/');
  };
  return (
    <View role="main" style={[styles.page, { backgroundColor: color.paper, paddingTop: top }]}>
      <ScrollView contentContainerStyle={styles.inside}>
        <Button
          label="Back"
          icon="back"
          kind="second"
          small
          onPress={back}
          testID="back"
          style={styles.back}
        />
        <Txt kind="display" heading={1} tabIndex={-1} ref={heading}>
          If someone is cut
        </Txt>
        {FIRST_AID.map(({ title, lines }, at) => (
          <View
            key={title}
            style={[styles.group, { backgroundColor: at === 0 ? color.madderTint : color.card }]}
          >
            <Txt kind="section" heading={2} style={styles.title}>
              {title}
            </Txt>
            {lines.map((line) => (
              <Txt key={line} style={styles.line}>
                {line}
              </Txt>
            ))}
          </View>
        ))}
        <Txt kind="small" color="ink2">
          {FIRST_AID_SOURCES}
        </Txt>
      </ScrollView>
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1 },
  inside: { width: '100%', maxWidth: 720, alignSelf: 'center', padding: 16, gap: 14 },
  back: { alignSelf: 'flex-start' },
  group: { borderRadius: 20, padding: 18, gap: 12 },
  title: { fontSize: 24, lineHeight: 29 },
  line: { fontFamily: font.strong, fontSize: 21, lineHeight: 28 },
});
