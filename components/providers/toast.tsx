import {
  createContext,
  type ReactNode,
  useCallback,
  useContext,
  useEffect,
  useMemo,
  useState,
} from 'react';
import { StyleSheet, View } from 'react-native';

import { type Toast, ToastBar } from '@/components/ui/toast-bar';

const SHOWN_MS = 6000;
const EDGE_PX = 12;

interface ToastContextValue {
  show(toast: Toast): void;
  setBottomOffset(px: number): void;
}

const ToastContext = createContext<ToastContextValue>({
  show: () => undefined,
  setBottomOffset: () => undefined,
});

interface Shown extends Toast {
  key: number;
}

export function ToastProvider({ children }: { children: ReactNode }) {
  const [toast, setToast] = useState<Shown | null>(null);
  const [bottomOffset, setBottomOffset] = useState(0);
  const show = useCallback((next: Toast) => {
    setToast((before) => ({ ...next, key: (before?.key ?? 0) + 1 }));
  }, []);

  const key = toast?.key;
  useEffect(() => {
    if (key === undefined) return undefined;
    const timer = setTimeout(() => setToast(null), SHOWN_MS);
    return () => clearTimeout(timer);
  }, [key]);

  const value = useMemo(() => ({ show, setBottomOffset }), [show]);
  const act = toast?.action;
  return (
    <ToastContext value={value}>
      {children}
      <View
        aria-live="polite"
        pointerEvents="box-none"
        style={[styles.place, { bottom: bottomOffset + EDGE_PX }]}
      >
        {toast && (
          <ToastBar
            key={toast.key}
            text={toast.text}
            action={
              act && {
                label: act.label,
                onPress: () => {
                  setToast(null);
                  act.onPress();
                },
              }
            }
          />
        )}
      </View>
    </ToastContext>
  );
}

/** Shows a line for six seconds, with at most one thing to press ("Put back"). */
export function useToast(): { show(toast: Toast): void } {
  return useContext(ToastContext);
}

/** Keeps toasts this many px off the bottom while the caller is mounted (a bar, the tally). */
export function useToastOffset(px: number): void {
  const { setBottomOffset } = useContext(ToastContext);
  useEffect(() => {
    setBottomOffset(px);
    return () => setBottomOffset(0);
  }, [px, setBottomOffset]);
}

const styles = StyleSheet.create({
  place: { position: 'absolute', left: 12, right: 12, maxWidth: 560, marginHorizontal: 'auto' },
});
