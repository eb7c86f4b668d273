import { type ReactNode, useId } from 'react';
import { StyleSheet, View } from 'react-native';

import { type Action, Button } from '@/components/ui/button';
import { Overlay } from '@/components/ui/overlay';
import { radius } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';

interface DialogProps {
  open: boolean;
  /** the question; focus starts on it, where no key answers */
  title: string;
  text?: string | undefined;
  children?: ReactNode;
  /** named by what they do; the one that is meant comes last */
  actions: readonly Action[];
  onClose: () => void;
  width?: number | undefined;
  testID?: string | undefined;
}

/** One question and its answers, over a scrim. */
export function Dialog(props: DialogProps) {
  const { open, title, text, children, actions, onClose, width = 420, testID } = props;
  const id = useId();
  return (
    <Overlay
      open={open}
      title={title}
      titleId={id}
      onClose={onClose}
      testID={testID}
      place={styles.place}
      box={{ borderRadius: radius.dialog, maxWidth: width }}
    >
      {text ? <Txt style={styles.text}>{text}</Txt> : null}
      {children ? <View style={styles.children}>{children}</View> : null}
      <View style={styles.actions}>
        {actions.map((action, at) => (
          <Button
            key={action.label}
            kind={at === actions.length - 1 ? 'main' : 'second'}
            {...action}
            style={styles.action}
          />
        ))}
      </View>
    </Overlay>
  );
}

const styles = StyleSheet.create({
  place: { justifyContent: 'center', padding: 12 },
  text: { marginTop: 8, fontSize: 17, lineHeight: 23 },
  children: { marginTop: 16 },
  actions: { marginTop: 20, flexDirection: 'row', flexWrap: 'wrap', gap: 10 },
  action: { flexGrow: 1, flexBasis: 130 },
});
