import type { ReactNode } from 'react';
import { Modal, ScrollView, StyleSheet, View, type ViewStyle } from 'react-native';

import { scrim, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { type KeyEvent, webOnly } from '@/components/ui/web-only';

interface OverlayProps {
  open: boolean;
  title: string;
  titleId: string;
  onClose: () => void;
  children: ReactNode;
  place: ViewStyle;
  box: ViewStyle;
  slide?: boolean | undefined;
  testID?: string | undefined;
}

// On the question itself these would count, answer or scroll the page behind.
const SWALLOWED = new Set([' ', 'Enter', 'PageDown', 'PageUp', 'ArrowRight', 'Backspace']);

function swallow(event: KeyEvent): void {
  if (!SWALLOWED.has(event.key)) return;
  event.preventDefault();
  event.stopPropagation();
}

/**
 * What dialogs and sheets share: a scrim that closes, and what react-native-web's Modal does: focus
 * on the first thing that takes it, which is the question; Tab kept inside; Escape closes; focus
 * goes back to where it was.
 */
export function Overlay(props: OverlayProps) {
  const { open, title, titleId, onClose, children } = props;
  const { name, color } = useTheme();
  const shadow = name === 'day' ? SHADOW : null;
  return (
    <Modal
      visible={open}
      transparent
      animationType={props.slide ? 'slide' : 'none'}
      onRequestClose={onClose}
      {...(open && { 'aria-labelledby': titleId })}
    >
      <View style={[styles.fill, props.place]} {...(props.testID && { testID: props.testID })}>
        <View
          style={[styles.scrim, { backgroundColor: scrim }]}
          {...webOnly({ onClick: onClose })}
        />
        <View
          style={[
            styles.box,
            { backgroundColor: color.card, borderColor: color.line },
            shadow,
            props.box,
          ]}
        >
          <ScrollView contentContainerStyle={styles.inside}>
            <View {...webOnly({ onKeyDown: swallow })}>
              <Txt kind="section" heading={2} id={titleId} tabIndex={-1} style={styles.title}>
                {title}
              </Txt>
            </View>
            {children}
          </ScrollView>
        </View>
      </View>
    </Modal>
  );
}

const SHADOW: ViewStyle = {
  boxShadow: '0 2px 6px rgba(42,32,23,0.12), 0 18px 44px rgba(42,32,23,0.20)',
};

const styles = StyleSheet.create({
  fill: { flex: 1, alignItems: 'center' },
  scrim: { position: 'absolute', top: 0, right: 0, bottom: 0, left: 0 },
  box: { width: '100%', maxHeight: '92%', borderWidth: 1, overflow: 'hidden' },
  inside: { paddingHorizontal: 22, paddingTop: 24, paddingBottom: 20 },
  title: {
    fontSize: 24,
    lineHeight: 29,
    borderRadius: 6,
    marginHorizontal: -6,
    paddingHorizontal: 6,
  },
});
