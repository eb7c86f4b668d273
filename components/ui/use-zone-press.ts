import { useRef } from 'react';
import { type GestureResponderEvent, Platform } from 'react-native';

const KEYPAD_HOLD_MS = 500;
const UNLOCK_HOLD_MS = 1000;
const RELEASES = ['touchend', 'mouseup'];

interface ZoneActs {
  onPressIn?: (() => void) | undefined;
  onPressOut?: (() => void) | undefined;
  onTap: () => void;
  onLongPress: () => void;
  onUnlock?: (() => void) | undefined;
}

interface ZoneSize {
  width: number;
  height: number;
}

/**
 * What the zone does when it is pressed: always `onPressIn`, then `onTap` or `onLongPress`.
 *
 * In a browser the end of a touch counts, not the click behind it: two places touched at once, as
 * by the side of a hand, make no click. A screen reader clicks without a touch.
 *
 * @param box the zone's size in px: a press that ends outside it was called off
 */
export function useZonePress(acts: ZoneActs, locked: boolean, box: ZoneSize) {
  const pressedIn = useRef(false);
  const pressIn = () => {
    pressedIn.current = true;
    acts.onPressIn?.();
  };
  const letGo = () => {
    if (!pressedIn.current) pressIn();
    pressedIn.current = false;
    acts.onTap();
  };
  if (locked) {
    return { onLongPress: () => acts.onUnlock?.(), delayLongPress: UNLOCK_HOLD_MS };
  }
  return {
    onPressIn: pressIn,
    onPressOut: (event: GestureResponderEvent) => {
      acts.onPressOut?.();
      if (pressedIn.current && isReleaseInside(event, box)) letGo();
    },
    onPress: (event: GestureResponderEvent) => {
      if (!followsTouch(event)) letGo();
    },
    onLongPress: () => {
      pressedIn.current = false;
      acts.onLongPress();
    },
    delayLongPress: KEYPAD_HOLD_MS,
  };
}

/** React Native's types know neither: react-native-web passes on the browser's `type` and `detail`. */
type BrowserEvent = Partial<GestureResponderEvent['nativeEvent']> & {
  type?: string;
  detail?: number;
};

function isReleaseInside({ nativeEvent }: GestureResponderEvent, box: ZoneSize): boolean {
  const { type = '', locationX = -1, locationY = -1 }: BrowserEvent = nativeEvent;
  const inside =
    locationX >= 0 && locationX <= box.width && locationY >= 0 && locationY <= box.height;
  return Platform.OS === 'web' && RELEASES.includes(type) && inside;
}

/** A click with a touch or a mouse behind it, which has counted already. */
function followsTouch(event: GestureResponderEvent): boolean {
  const { detail = 0 }: BrowserEvent = event?.nativeEvent ?? {};
  return Platform.OS === 'web' && detail > 0;
}
