import { useId } from 'react';
import { Pressable, StyleSheet, TextInput, View } from 'react-native';

import { FieldError } from '@/components/ui/field-error';
import { Icon } from '@/components/ui/icon';
import { border, radius, size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font, numerals } from '@/components/ui/type';
import { useHold } from '@/components/ui/use-hold';
import { useTextScale } from '@/components/ui/use-text-scale';
import { webOnly } from '@/components/ui/web-only';

export interface StepperProps {
  label: string;
  value: string;
  onChangeText: (text: string) => void;
  onStep: (by: 1 | -1) => void;
  onBlur?: (() => void) | undefined;
  unit?: string | undefined;
  error?: string | undefined;
  canLess?: boolean | undefined;
  canMore?: boolean | undefined;
  testID?: string | undefined;
}

/** A number to type or to step: − and + at the ends, arrow keys while it is being typed. */
export function Stepper(props: StepperProps) {
  const { label, value, unit, error, onStep, canLess = true, canMore = true } = props;
  const { color } = useTheme();
  const scale = useTextScale();
  const id = useId();
  const edge = error ? color.madderInk : color.edge;
  const stepByKey = (key: string) => {
    if (key === 'ArrowUp' && canMore) onStep(1);
    if (key === 'ArrowDown' && canLess) onStep(-1);
  };
  return (
    <View style={styles.field}>
      <Txt kind="small" color="ink2" style={styles.label}>
        {label}
      </Txt>
      <View
        {...webOnly({ dataSet: { ring: 'field' } })}
        style={[styles.box, { backgroundColor: color.card, borderColor: edge }]}
      >
        <End label={`Less, ${label}`} icon="minus" possible={canLess} onStep={() => onStep(-1)} />
        <View style={styles.middle} {...webOnly({ onClick: focusInput })}>
          <TextInput
            value={value}
            onChangeText={props.onChangeText}
            {...(props.onBlur && { onBlur: props.onBlur })}
            onKeyPress={(event) => stepByKey(event.nativeEvent.key)}
            inputMode="text"
            selectTextOnFocus
            {...(props.testID && { testID: props.testID })}
            aria-label={unit ? `${label}, ${unit}` : label}
            {...webOnly({
              'aria-invalid': error !== undefined,
              'aria-describedby': error ? `${id}-error` : undefined,
            })}
            style={[
              styles.input,
              numerals,
              unit ? styles.besideUnit : null,
              { color: color.ink, fontSize: 20 * scale },
            ]}
          />
          {unit ? (
            <Txt kind="lead" hidden style={styles.unit}>
              {unit}
            </Txt>
          ) : null}
          {unit && scale < 1.3 ? <View style={styles.spacer} /> : null}
        </View>
        <End label={`More, ${label}`} icon="plus" possible={canMore} onStep={() => onStep(1)} />
      </View>
      <FieldError id={`${id}-error`} error={error} />
    </View>
  );
}

/** The number is narrow beside its unit on a small phone: all between the ends leads to it. */
function focusInput({ currentTarget }: { currentTarget: unknown }): void {
  if (currentTarget instanceof Element) currentTarget.querySelector('input')?.focus();
}

interface EndProps {
  label: string;
  icon: 'minus' | 'plus';
  possible: boolean;
  onStep: () => void;
}

function End({ label, icon, possible, onStep }: EndProps) {
  const { color } = useTheme();
  return (
    <Pressable
      role="button"
      aria-label={label}
      disabled={!possible}
      {...webOnly({ dataSet: { ring: 'inside' } })}
      {...useHold(onStep, possible)}
      style={({ pressed }) => [styles.end, pressed && { backgroundColor: color.sunk }]}
    >
      <Icon name={icon} size={21} color={possible ? color.ink : color.edge} stroke={2.4} />
    </Pressable>
  );
}

const styles = StyleSheet.create({
  field: { gap: 5 },
  label: { fontFamily: font.strong },
  box: {
    minHeight: size.stepper,
    borderWidth: border.control,
    borderRadius: radius.control,
    flexDirection: 'row',
    alignItems: 'center',
  },
  end: {
    width: size.touchMin,
    minHeight: size.touchMin,
    borderRadius: 14,
    alignItems: 'center',
    justifyContent: 'center',
  },
  middle: {
    flex: 1,
    minWidth: 0,
    alignSelf: 'stretch',
    flexDirection: 'row',
    alignItems: 'center',
  },
  input: {
    flex: 1,
    minWidth: 0,
    alignSelf: 'stretch',
    minHeight: size.touchMin,
    textAlign: 'center',
    fontFamily: font.bold,
    borderRadius: 8,
  },
  besideUnit: { flex: 3, textAlign: 'right' },
  unit: { paddingLeft: 5, fontSize: 20, lineHeight: 26 },
  spacer: { flex: 1 }, // keeps number and unit together in the middle
});
