import type { ReactNode } from 'react';
import { Platform, StyleSheet, View } from 'react-native';

import { useStoreStatus } from '@/components/providers/use-store-status';
import { failureTexts } from '@/components/shell/store-texts';
import { useSaveCopy } from '@/components/shell/use-save-copy';
import type { Action } from '@/components/ui/button';
import { ErrorState } from '@/components/ui/error-state';
import { LoadingBlocks } from '@/components/ui/loading-blocks';
import { Note } from '@/components/ui/note';
import { projects } from '@/sync/client/projects';
import type { StoreFailure, StoreStatus } from '@/sync/client/projects-client';

/** Shows a page's contents once the store is open, and says so calmly while or where it is not. */
export function StoreGate({ children }: { children: ReactNode }) {
  const status = useStoreStatus();
  if (status.phase === 'starting') return <LoadingBlocks label="Opening your projects" />;
  if (status.phase === 'failed') return <StoreFailed failure={status.failure} />;
  return (
    <>
      <StorageNote status={status} />
      {children}
    </>
  );
}

function StoreFailed({ failure }: { failure: StoreFailure | null }) {
  const saveCopy = useSaveCopy();
  const again: Action = {
    label: 'Try again',
    icon: 'refresh',
    onPress: () => void projects.start(),
    testID: 'try-again',
  };
  const reload: Action = { label: 'Reload', icon: 'refresh', onPress: () => location.reload() };
  const copy: Action = { label: 'Save a copy', icon: 'file', onPress: () => void saveCopy() };
  const first = failure?.kind === 'newer-schema' && Platform.OS === 'web' ? reload : again;
  const readable = failure?.kind === 'storage-full' || failure?.kind === 'failed';
  return <ErrorState {...failureTexts(failure)} actions={readable ? [first, copy] : [first]} />;
}

function StorageNote({ status }: { status: StoreStatus }) {
  const saveCopy = useSaveCopy();
  const copy = { label: 'Save a copy', onPress: () => void saveCopy() };
  if (status.storage === 'memory') {
    return (
      <View style={styles.note}>
        <Note
          tone="caution"
          title="This browser gives no lasting storage."
          text="Keep this tab open, and save a copy before you close it: a reload may lose the last second."
          action={copy}
        />
      </View>
    );
  }
  if (status.persisted !== false) return null;
  return (
    <View style={styles.note}>
      <Note
        tone="info"
        title="Saved on this device."
        text="The browser may clear it when room runs short. Save a copy now and then."
        action={copy}
      />
    </View>
  );
}

const styles = StyleSheet.create({ note: { marginBottom: 12 } });
