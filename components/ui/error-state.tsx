import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { Actions } from '@/components/ui/actions';
import { type Action, Button } from '@/components/ui/button';
import { Icon } from '@/components/ui/icon';
import { border, radius, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';

interface ErrorStateProps {
  /** what did not work */
  title: string;
  /** what is kept */
  text: string;
  actions: readonly Action[];
  /** for whoever asks what went wrong */
  detail?: string | undefined;
}

/** What did not work, what is kept, and what to do now. */
export function ErrorState({ title, text, actions, detail }: ErrorStateProps) {
  const { color } = useTheme();
  const [open, setOpen] = useState(false);
  return (
    <View
      role="alert"
      style={[styles.card, { backgroundColor: color.card, borderColor: color.line }]}
    >
      <View style={[styles.sign, { backgroundColor: color.madderTint }]}>
        <Icon name="octagon" size={28} color="madderInk" />
      </View>
      <Txt kind="section" heading={2} style={styles.title}>
        {title}
      </Txt>
      <Txt style={styles.text}>{text}</Txt>
      <Actions actions={actions} />
      {detail ? (
        <Button
          label="What went wrong"
          kind="quiet"
          small
          onPress={() => setOpen(!open)}
          style={styles.why}
        />
      ) : null}
      {open && (
        <Txt kind="small" color="ink2" live="polite">
          {detail}
        </Txt>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  card: {
    borderRadius: radius.card,
    borderWidth: border.hair,
    paddingHorizontal: 20,
    paddingVertical: 20,
    width: '100%',
    maxWidth: 560,
  },
  sign: {
    width: 56,
    height: 56,
    borderRadius: 17,
    alignItems: 'center',
    justifyContent: 'center',
  },
  title: { fontSize: 25, lineHeight: 30, marginTop: 16 },
  text: { fontSize: 17, lineHeight: 23, marginTop: 9, marginBottom: 20 },
  why: { alignSelf: 'flex-start', marginTop: 8, marginLeft: -14 },
});
