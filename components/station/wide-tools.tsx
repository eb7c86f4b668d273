import { StyleSheet, View } from 'react-native';

import {
  BackButton,
  StationToolButtons,
  type StationTools,
} from '@/components/station/station-tools';
import { SavedChip } from '@/components/ui/saved-chip';

interface WideToolsProps {
  projectId: string;
  tools: StationTools;
  chip: boolean;
}

/** The right end of a wide station page's top row. */
export function WideTools({ projectId, tools, chip }: WideToolsProps) {
  return (
    <View style={styles.row}>
      {chip ? <SavedChip /> : null}
      <BackButton projectId={projectId} />
      <StationToolButtons tools={tools} />
    </View>
  );
}

const styles = StyleSheet.create({ row: { flexDirection: 'row', alignItems: 'center', gap: 4 } });
