import { StyleSheet, View } from 'react-native';

import { CautionList } from '@/components/safety/caution-list';
import { CAUTION_GROUPS, DEFERENCE } from '@/components/safety/cautions';
import { PlacePage } from '@/components/shell/place-page';
import { LinkText } from '@/components/ui/link-text';
import { Note } from '@/components/ui/note';
import { Txt } from '@/components/ui/txt';

/** `/me/safety`: every caution with its source, and who comes first. */
export function SafetyScreen() {
  return (
    <PlacePage place="me" title="Safety" back={{ label: 'Me', href: '/me' }}>
      <View style={styles.page}>
        <Note tone="info" title="Others come first." text={DEFERENCE} />
        <LinkText href="/first-aid">First aid for a cut</LinkText>
        {CAUTION_GROUPS.map((group) => (
          <View key={group.title} style={styles.group}>
            <Txt kind="section" heading={2}>
              {group.title}
            </Txt>
            <CautionList group={group} sources />
          </View>
        ))}
      </View>
    </PlacePage>
  );
}

const styles = StyleSheet.create({
  page: { gap: 20, paddingHorizontal: 8 },
  group: { gap: 10 },
});
