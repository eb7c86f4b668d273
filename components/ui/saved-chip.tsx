import { StyleSheet, View } from 'react-native';

import { useStoreStatus } from '@/components/providers/use-store-status';
import { Chip, type ChipProps } from '@/components/ui/chip';
import type { StoreStatus } from '@/sync/client/projects-client';

function words(status: StoreStatus): ChipProps {
  if (status.phase === 'failed') return { label: 'Not saved', icon: 'octagon', tone: 'error' };
  if (status.phase === 'starting') return { label: 'Opening', icon: 'hourglass', tone: 'plain' };
  if (status.storage === 'memory') {
    return { label: 'Kept in this browser only', icon: 'triangle', tone: 'caution' };
  }
  return { label: 'Saved on this device', icon: 'check', tone: 'done' };
}

/** Where the counts are; without an account they are on this device and nowhere else. */
export function SavedChip() {
  return (
    <View role="status" testID="saved-chip" style={styles.place}>
      <Chip tall {...words(useStoreStatus())} />
    </View>
  );
}

const styles = StyleSheet.create({ place: { maxWidth: '100%' } });
