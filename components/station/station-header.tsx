import { Pressable, StyleSheet, View } from 'react-native';

import {
  BackButton,
  StationToolButtons,
  type StationTools,
} from '@/components/station/station-tools';
import { deviceName, Spoken } from '@/components/ui/spoken';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { pressable } from '@/components/ui/web-only';

interface StationHeaderProps {
  projectId: string;
  projectName: string;
  /** "Step 4 of 18" */
  stepText: string;
  /** null on the safety check, where neither is wanted */
  tools: StationTools | null;
  onSteps: (() => void) | null;
}

/** Back, the project and its step; then what keeps the screen awake, the lock, and first aid. */
export function StationHeader(props: StationHeaderProps) {
  const { projectId, projectName, stepText, tools, onSteps } = props;
  return (
    <View style={styles.row}>
      <BackButton projectId={projectId} />
      <HeaderName name={projectName} stepText={stepText} onPress={onSteps} />
      <StationToolButtons tools={tools} />
    </View>
  );
}

function HeaderName(props: { name: string; stepText: string; onPress: (() => void) | null }) {
  const { name, stepText, onPress } = props;
  const words = (
    <>
      <Txt kind="body" numberOfLines={1} style={styles.name}>
        {name}
      </Txt>
      <Txt kind="small" color="ink2" numberOfLines={1}>
        {stepText}
      </Txt>
    </>
  );
  if (!onPress) return <View style={styles.middle}>{words}</View>;
  return (
    <Pressable
      {...pressable}
      role="button"
      {...deviceName(`${name}, ${stepText}. All steps`)}
      testID="steps"
      onPress={onPress}
      style={styles.middle}
    >
      {words}
      <Spoken>All steps</Spoken>
    </Pressable>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', minHeight: 50, paddingHorizontal: 4, gap: 2 },
  middle: { flex: 1, minWidth: 0, minHeight: 48, justifyContent: 'center' },
  name: { fontFamily: font.bold },
});
