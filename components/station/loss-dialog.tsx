import { useState } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';

import { countItem, itemLetters } from '@/components/steps/item-words';
import { unitWord } from '@/components/steps/messages';
import { Dialog } from '@/components/ui/dialog';
import { Stepper } from '@/components/ui/stepper';
import { Swatch } from '@/components/ui/swatch';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { pressable, pressedBySpace, webOnly } from '@/components/ui/web-only';
import type { Plan, PlanStep } from '@/shared/model/plan';
import type { RequestFabric } from '@/shared/model/plan-request';

/** An item that a step makes, and how many of it stand. */
export interface LosableItem {
  item: string;
  good: number;
}

interface LossDialogProps {
  plan: Plan;
  step: PlanStep;
  items: readonly LosableItem[];
  good: number;
  onLose: (item: string, pieces: number) => void;
  onClose: () => void;
}

/** Which piece was miscut or lost, and how many. */
export function LossDialog({ plan, step, items, good, onLose, onClose }: LossDialogProps) {
  const possible = items.filter((each) => each.good > 0);
  const [item, setItem] = useState(possible.length === 1 ? (possible[0]?.item ?? null) : null);
  const [text, setText] = useState('1');
  const [tried, setTried] = useState(false);
  const most = possible.find((each) => each.item === item)?.good ?? 0;
  const count = /^\d+$/.test(text) ? Number(text) : 0;
  const fits = item !== null && count >= 1 && count <= most;
  const miscut = step.station === 'table';
  const unit = unitWord(step.role, 1);
  return (
    <Dialog
      open
      title={`Which ${unit} was ${miscut ? 'miscut' : 'lost'}?`}
      text={`${count === 1 ? `1 ${unit} comes` : `${count} ${unitWord(step.role, count)} come`} off the count.`}
      onClose={onClose}
      testID="loss-dialog"
      actions={[
        { label: `Keep ${good}`, onPress: onClose, testID: 'loss-no' },
        {
          label: `Take ${count} off`,
          testID: 'loss-yes',
          onPress: () => {
            if (fits) onLose(item, count);
            else setTried(true);
          },
        },
      ]}
    >
      <View role="radiogroup" aria-label="Piece" style={styles.items}>
        {possible.map((each) => (
          <ItemChoice
            key={each.item}
            item={each.item}
            fabrics={plan.request.fabrics}
            chosen={each.item === item}
            onPress={() => setItem(each.item)}
          />
        ))}
      </View>
      {tried && item === null ? (
        <Txt kind="small" color="madderInk" live="polite">
          Choose one first.
        </Txt>
      ) : null}
      <Stepper
        label="How many"
        value={text}
        onChangeText={setText}
        onStep={(by) => setText(String(Math.max(1, count + by)))}
        canLess={count > 1}
        canMore={item === null || count < most}
        error={item !== null && (count < 1 || count > most) ? `Use 1 to ${most}.` : undefined}
        testID="loss-count"
      />
    </Dialog>
  );
}

interface ItemChoiceProps {
  item: string;
  fabrics: readonly RequestFabric[];
  chosen: boolean;
  onPress: () => void;
}

function ItemChoice({ item, fabrics, chosen, onPress }: ItemChoiceProps) {
  const { color } = useTheme();
  const letters = itemLetters(item).split('+');
  const own =
    letters.length === 1 ? fabrics.find(({ letter }) => letter === letters[0]) : undefined;
  const word = own ? `${own.letter}, ${own.name}` : countItem(item, 1);
  return (
    <Pressable
      {...pressable}
      {...webOnly({ tabIndex: 0 })}
      {...pressedBySpace(onPress)}
      role="radio"
      aria-checked={chosen}
      aria-label={word}
      testID={`item-${item}`}
      onPress={onPress}
      style={[styles.item, { borderColor: chosen ? color.ink : 'transparent' }]}
    >
      {own ? <Swatch fabric={own} size={44} label="" /> : <Txt>{word}</Txt>}
    </Pressable>
  );
}

const styles = StyleSheet.create({
  items: { flexDirection: 'row', flexWrap: 'wrap', gap: 8, marginBottom: 12 },
  item: {
    minWidth: 54,
    minHeight: 54,
    alignItems: 'center',
    justifyContent: 'center',
    borderWidth: 3,
    borderRadius: 16,
    paddingHorizontal: 2,
  },
});
