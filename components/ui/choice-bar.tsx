import { useId } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';

import { border, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';
import { type KeyEvent, pressedBySpace, webOnly } from '@/components/ui/web-only';

export interface Choice<Value extends string> {
  value: Value;
  label: string;
}

interface ChoiceBarProps<Value extends string> {
  label: string;
  /** the label is read out but not shown */
  quiet?: boolean | undefined;
  options: readonly Choice<Value>[];
  value: Value;
  onChange: (value: Value) => void;
  testID?: string | undefined;
}

const STEPS: Record<string, 1 | -1> = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 };

/** One of a few: a radio group in which the arrow keys move and choose. */
export function ChoiceBar<Value extends string>(props: ChoiceBarProps<Value>) {
  const { label, quiet = false, options, value, onChange } = props;
  const { color } = useTheme();
  const id = useId();
  const chosen = options.findIndex((option) => option.value === value);
  const move = (event: KeyEvent) => {
    const step = STEPS[event.key];
    if (step === undefined) return;
    event.preventDefault();
    event.stopPropagation();
    const at = (chosen + step + options.length) % options.length;
    const next = options[at];
    if (!next) return;
    onChange(next.value);
    focusRadio(event.currentTarget, at);
  };

  return (
    <View style={styles.field}>
      {!quiet && (
        <Txt kind="small" color="ink2" style={styles.label} id={id}>
          {label}
        </Txt>
      )}
      <View
        role="radiogroup"
        {...(quiet ? { 'aria-label': label } : { 'aria-labelledby': id })}
        {...webOnly({ onKeyDown: move })}
        {...(props.testID && { testID: props.testID })}
        style={[styles.bar, { backgroundColor: color.sunk }]}
      >
        {options.map((option, at) => {
          const on = option.value === value;
          const tabbable = on || (chosen < 0 && at === 0);
          return (
            <Pressable
              key={option.value}
              role="radio"
              aria-checked={on}
              {...webOnly({ tabIndex: tabbable ? 0 : -1 })}
              {...pressedBySpace(() => onChange(option.value))}
              onPress={() => onChange(option.value)}
              style={[styles.tab, on && { backgroundColor: color.card, borderColor: color.edge }]}
            >
              <Txt align="center" color={on ? 'ink' : 'ink2'} style={on ? styles.on : styles.off}>
                {option.label}
              </Txt>
            </Pressable>
          );
        })}
      </View>
    </View>
  );
}

/** The browser's own radio groups move the focus along with the choice. */
function focusRadio(group: unknown, at: number): void {
  if (!(group instanceof Element)) return;
  group.querySelectorAll<HTMLElement>('[role=radio]')[at]?.focus();
}

const styles = StyleSheet.create({
  field: { gap: 5 },
  label: { fontFamily: font.strong },
  bar: { flexDirection: 'row', flexWrap: 'wrap', borderRadius: 15, padding: 3 },
  tab: {
    flexGrow: 1,
    flexBasis: 'auto',
    minWidth: 56,
    minHeight: 44,
    paddingHorizontal: 8,
    borderRadius: 12,
    borderWidth: border.control,
    borderColor: 'transparent',
    alignItems: 'center',
    justifyContent: 'center',
  },
  on: { fontFamily: font.bold, fontSize: 15.5 },
  off: { fontFamily: font.strong, fontSize: 15.5 },
});
