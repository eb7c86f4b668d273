import { Children, type ReactNode, type Ref } from 'react';
import { type StyleProp, StyleSheet, Text, type TextStyle } from 'react-native';

import { BuiltFraction } from '@/components/ui/built-fraction';
import type { ColorRole } from '@/components/ui/colors';
import { splitFractions } from '@/components/ui/split-fractions';
import { useTheme } from '@/components/ui/theme';
import { numerals, type TextKind, textMetrics, type } from '@/components/ui/type';
import { useLayout } from '@/components/ui/use-layout';
import { useTextScale } from '@/components/ui/use-text-scale';
import { webOnly } from '@/components/ui/web-only';

export interface TxtProps {
  kind?: TextKind | undefined;
  /** a colour role or any colour */
  color?: ColorRole | (string & {}) | undefined;
  align?: 'left' | 'center' | 'right' | undefined;
  heading?: 1 | 2 | 3 | undefined;
  numberOfLines?: number | undefined;
  style?: StyleProp<TextStyle>;
  children?: ReactNode;
  id?: string | undefined;
  testID?: string | undefined;
  live?: 'polite' | 'assertive' | undefined;
  hidden?: boolean | undefined;
  tabIndex?: 0 | -1 | undefined;
  ref?: Ref<Text> | undefined;
}

/** Text of the look. Eighths and n⁄d fractions inside its strings are built and read plainly. */
export function Txt({ ref, ...props }: TxtProps) {
  const { kind = 'body', color = 'ink', align, heading, children } = props;
  const theme = useTheme();
  const scale = useTextScale();
  const { kind: layout } = useLayout();
  const wide = layout === 'wide' || layout === 'desk';
  const own = StyleSheet.flatten<TextStyle>(props.style);
  const metrics = textMetrics(type[kind], scale, wide, own);
  const ink = color in theme.color ? theme.color[color as ColorRole] : color;
  return (
    <Text
      ref={ref ?? null}
      {...(heading && { role: 'heading' as const, ...webOnly({ 'aria-level': heading }) })}
      {...(props.id && { id: props.id })}
      {...(props.testID && { testID: props.testID })}
      {...(props.live && { 'aria-live': props.live })}
      {...(props.hidden && { 'aria-hidden': true })}
      {...(props.tabIndex !== undefined && webOnly({ tabIndex: props.tabIndex }))}
      {...(props.numberOfLines && { numberOfLines: props.numberOfLines })}
      style={[numerals, { color: ink }, align && { textAlign: align }, metrics]}
    >
      {drawRuns(children, metrics.fontSize, String(metrics.color ?? ink))}
    </Text>
  );
}

/** Puts built fractions in place of those that the font lacks. */
function drawRuns(children: ReactNode, fontSize: number, color: string): ReactNode {
  const parts = Array.isArray(children) ? children : [children];
  if (parts.every((part) => typeof part === 'string' || typeof part === 'number')) {
    return drawText(parts.join(''), fontSize, color);
  }
  return Children.map(children, (child) =>
    typeof child === 'string' ? drawText(child, fontSize, color) : child,
  );
}

function drawText(text: string, fontSize: number, color: string): ReactNode {
  const runs = splitFractions(text);
  if (runs.every((run) => run.kind === 'text')) return text;
  return runs.map((run, at) => {
    if (run.kind === 'text') return run.text;
    return <BuiltFraction key={at} {...run} fontSize={fontSize} color={color} />;
  });
}
