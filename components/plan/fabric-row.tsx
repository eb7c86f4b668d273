import { Pressable, StyleSheet, View } from 'react-native';

import { moveFabric } from '@/components/plan/draft-fabrics';
import type { Setup } from '@/components/plan/use-setup';
import { Chip } from '@/components/ui/chip';
import { FieldError } from '@/components/ui/field-error';
import { Icon } from '@/components/ui/icon';
import { deviceName, Spoken } from '@/components/ui/spoken';
import { Swatch } from '@/components/ui/swatch';
import { size, space, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { pressable } from '@/components/ui/web-only';
import type { RequestFabric } from '@/shared/model/plan-request';

interface FabricRowProps {
  setup: Setup;
  id: string;
  fabric: RequestFabric;
  error: string | undefined;
  onOpen: () => void;
  testID: string;
}

/** One cloth: the row opens it, and wedge fabrics move up and down without a drag. */
export function FabricRow({ setup, id, fabric, error, onOpen, testID }: FabricRowProps) {
  const { color } = useTheme();
  const place = setup.draft.wedgeFabrics.findIndex((wedge) => wedge.id === id);
  const last = setup.draft.wedgeFabrics.length - 1;
  const { letter, name, dominant, oneWay } = fabric;
  return (
    <View role="listitem">
      <View style={styles.row}>
        <Pressable
          {...pressable}
          role="button"
          {...deviceName(`Change fabric ${letter}, ${name}`)}
          onPress={onOpen}
          testID={testID}
          style={({ pressed }) => [styles.open, pressed && { backgroundColor: color.sunk }]}
        >
          <Spoken>{`Change fabric ${letter}, `}</Spoken>
          <Swatch fabric={fabric} size={44} dominant={dominant} label="" />
          <Txt style={styles.name} numberOfLines={2}>
            {name}
          </Txt>
          {dominant ? <Chip label="Dominant" icon="star" tone="caution" /> : null}
          {oneWay ? <Chip label="One-way" /> : null}
        </Pressable>
        {place >= 0 ? (
          <>
            <Move
              label={`Move up, ${letter} ${name}`}
              possible={place > 0}
              onPress={() => setup.change((draft) => moveFabric(draft, id, -1))}
            />
            <Move
              label={`Move down, ${letter} ${name}`}
              down
              possible={place < last}
              onPress={() => setup.change((draft) => moveFabric(draft, id, 1))}
            />
          </>
        ) : null}
      </View>
      <FieldError id={`${testID}-error`} error={error} />
    </View>
  );
}

interface MoveProps {
  label: string;
  down?: boolean;
  possible: boolean;
  onPress: () => void;
}

function Move({ label, down = false, possible, onPress }: MoveProps) {
  const { color } = useTheme();
  return (
    <Pressable
      {...pressable}
      role="button"
      aria-label={label}
      aria-disabled={!possible}
      onPress={() => possible && onPress()}
      style={({ pressed }) => [styles.move, pressed && { backgroundColor: color.sunk }]}
    >
      <View style={down ? styles.down : null}>
        <Icon name="arrowUp" color={possible ? color.ink : color.edge} />
      </View>
    </Pressable>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: space[1] },
  open: {
    flex: 1,
    minWidth: 0,
    minHeight: 56,
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: space[3],
    borderRadius: 14,
    paddingVertical: 5,
  },
  name: { fontFamily: font.strong, flexShrink: 1 },
  move: {
    width: size.touchMin,
    height: size.touchMin,
    borderRadius: 14,
    alignItems: 'center',
    justifyContent: 'center',
  },
  down: { transform: [{ rotate: '180deg' }] },
});
