import { type ReactNode, useId } from 'react';
import { StyleSheet, View } from 'react-native';

import { Button } from '@/components/ui/button';
import { Overlay } from '@/components/ui/overlay';
import { radius } from '@/components/ui/theme';
import { useLayout } from '@/components/ui/use-layout';
import { useReducedMotion } from '@/components/ui/use-reduced-motion';

interface SheetProps {
  open: boolean;
  title: string;
  onClose: () => void;
  children: ReactNode;
  testID?: string | undefined;
}

/** More to read or choose: from the bottom on a phone, in the middle on a wide screen. */
export function Sheet({ open, title, onClose, children, testID }: SheetProps) {
  const { kind } = useLayout();
  const still = useReducedMotion();
  const id = useId();
  const low = kind === 'phone';
  return (
    <Overlay
      open={open}
      title={title}
      titleId={id}
      onClose={onClose}
      testID={testID}
      slide={low && !still}
      place={low ? styles.bottom : styles.middle}
      box={low ? styles.sheet : styles.card}
    >
      <View style={styles.children}>{children}</View>
      <Button label="Close" kind="second" onPress={onClose} style={styles.close} />
    </Overlay>
  );
}

const styles = StyleSheet.create({
  bottom: { justifyContent: 'flex-end' },
  middle: { justifyContent: 'center', padding: 24 },
  sheet: { borderTopLeftRadius: radius.dialog, borderTopRightRadius: radius.dialog },
  card: { borderRadius: radius.dialog, maxWidth: 560 },
  children: { marginTop: 12 },
  close: { marginTop: 20 },
});
