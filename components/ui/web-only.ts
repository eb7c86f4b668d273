import { Platform } from 'react-native';

interface WebProps {
  dataSet?: Record<string, string>;
  'aria-current'?: 'page' | 'step' | 'true' | undefined;
  'aria-describedby'?: string | undefined;
  'aria-invalid'?: boolean | undefined;
  'aria-level'?: number | undefined;
  'aria-pressed'?: boolean | undefined;
  'aria-controls'?: string | undefined;
  'aria-atomic'?: boolean | undefined;
  lang?: string | undefined;
  tabIndex?: 0 | -1 | undefined;
  onKeyDown?: (event: KeyEvent) => void;
  onMouseEnter?: () => void;
  onMouseLeave?: () => void;
  onFocus?: () => void;
  onBlur?: () => void;
  onClick?: (event: { currentTarget: unknown }) => void;
  inert?: boolean | undefined;
}

export interface KeyEvent {
  key: string;
  repeat?: boolean;
  currentTarget: unknown;
  preventDefault(): void;
  stopPropagation(): void;
}

/** Props that react-native-web knows and React Native's types do not; nothing on a device. */
export function webOnly(props: WebProps): object {
  return Platform.OS === 'web' ? props : {};
}

/**
 * Lets Space press a box, a switch, a radio or a tab, as it does in a browser's own:
 * react-native-web answers Space for buttons only.
 */
export function pressedBySpace(onPress: () => void): object {
  const press = (event: KeyEvent) => {
    if (event.key !== ' ') return;
    event.preventDefault(); // the page would scroll
    if (!event.repeat) onPress();
  };
  return webOnly({ onKeyDown: press });
}

/** Marks what shrinks a little while it is pressed; the movement itself is in public/app.css. */
export const pressable = webOnly({ dataSet: { press: 'scale' } });
