import { useId } from 'react';
import { type InputModeOptions, StyleSheet, TextInput, View } from 'react-native';

import { FieldError } from '@/components/ui/field-error';
import { border, radius, size, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font, numerals } from '@/components/ui/type';
import { useTextScale } from '@/components/ui/use-text-scale';
import { webOnly } from '@/components/ui/web-only';

export interface FieldProps {
  label: string;
  value: string;
  onChangeText: (text: string) => void;
  onBlur?: (() => void) | undefined;
  unit?: string | undefined;
  /** what is wrong, then what works, in two short sentences */
  error?: string | undefined;
  hint?: string | undefined;
  inputMode?: InputModeOptions | undefined;
  multiline?: boolean | undefined;
  maxLength?: number | undefined;
  testID?: string | undefined;
}

/** A text field: label above, unit inside at the right, error below. */
export function Field(props: FieldProps) {
  const { label, value, unit, error, hint, multiline = false } = props;
  const { color } = useTheme();
  const scale = useTextScale();
  const id = useId();
  const describedBy = [error && `${id}-error`, hint && `${id}-hint`].filter(Boolean).join(' ');
  return (
    <View style={styles.field}>
      <Txt kind="small" color="ink2" style={styles.label} id={`${id}-label`}>
        {label}
      </Txt>
      <View
        {...webOnly({ dataSet: { ring: 'field' } })}
        style={[
          styles.box,
          { backgroundColor: color.card, borderColor: error ? color.madderInk : color.edge },
          error ? styles.wrong : null,
        ]}
      >
        <TextInput
          value={value}
          onChangeText={props.onChangeText}
          multiline={multiline}
          {...(props.onBlur && { onBlur: props.onBlur })}
          {...(props.inputMode && { inputMode: props.inputMode })}
          {...(props.maxLength && { maxLength: props.maxLength })}
          {...(props.testID && { testID: props.testID })}
          aria-label={unit ? `${label}, ${unit}` : label}
          {...webOnly({
            'aria-invalid': error !== undefined,
            'aria-describedby': describedBy || undefined,
          })}
          style={[
            styles.input,
            numerals,
            { color: color.ink, fontSize: 19 * scale },
            multiline && styles.lines,
          ]}
        />
        {unit ? (
          <Txt kind="lead" color="ink2" hidden>
            {unit}
          </Txt>
        ) : null}
      </View>
      {hint ? (
        <Txt kind="small" color="ink2" id={`${id}-hint`}>
          {hint}
        </Txt>
      ) : null}
      <FieldError id={`${id}-error`} error={error} />
    </View>
  );
}

const styles = StyleSheet.create({
  field: { gap: 5 },
  label: { fontFamily: font.strong },
  box: {
    minHeight: size.field,
    borderWidth: border.control,
    borderRadius: radius.control,
    flexDirection: 'row',
    alignItems: 'center',
    paddingRight: 16,
  },
  wrong: { borderWidth: border.zone },
  input: {
    flex: 1,
    minWidth: 0,
    alignSelf: 'stretch',
    minHeight: size.field - 2 * border.zone,
    paddingLeft: 16,
    paddingRight: 8,
    borderRadius: radius.control,
    fontFamily: font.bold,
  },
  lines: { minHeight: 112, paddingVertical: 14, fontFamily: font.body },
});
