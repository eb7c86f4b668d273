import { StyleSheet, View } from 'react-native';

import { StationToolButtons, type StationTools } from '@/components/station/station-tools';
import { SavedChip } from '@/components/ui/saved-chip';

interface WideToolsProps {
  tools: StationTools;
  chip: boolean;
}

/** The right end of a wide station page's top row. */
export function WideTools({ tools, chip }: WideToolsProps) {
  return (
    <View style={styles.row}>
      {chip ? <SavedChip /> : null}
      <StationToolButtons tools={tools} />
    </View>
  );
}

const styles = StyleSheet.create({ row: { flexDirection: 'row', alignItems: 'center', gap: 4 } });
