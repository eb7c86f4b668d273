import { useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { Section } from '@/components/me/section';
import { serverText, storageText } from '@/components/me/device-texts';
import { useStoreStatus } from '@/components/providers/use-store-status';
import { Txt } from '@/components/ui/txt';
import { fetchServerHealth } from '@/sync/client/api/server-health';
import { projects } from '@/sync/client/projects';

/** Where the counts are kept, how firmly, whether the server answers, and which build this is. */
export function ThisDevice() {
  const status = useStoreStatus();
  const durability = useDurability(status.phase === 'ready');
  const health = useQuery({
    queryKey: ['server-health'],
    queryFn: ({ signal }) => fetchServerHealth(signal),
    staleTime: 0,
  });
  return (
    <Section title="This device">
      <Fact name="Storage" value={storageText(status)} id="storage" />
      {durability === null ? null : (
        <Fact name="Written to disk" value={durability} id="durability" />
      )}
      <Fact name="Server" value={serverText(health.status, health.fetchStatus)} id="server" />
      <Fact name="Build" value={process.env.EXPO_PUBLIC_BUILD ?? 'unnamed'} id="build" />
    </Section>
  );
}

/** Asked of the database itself once it is open. */
function useDurability(ready: boolean): string | null {
  const [durability, setDurability] = useState<string | null>(null);
  useEffect(() => {
    if (!ready) return undefined;
    let gone = false;
    projects.durability().then(
      (answer) => !gone && setDurability(answer),
      () => !gone && setDurability(null),
    );
    return () => {
      gone = true;
    };
  }, [ready]);
  return durability;
}

function Fact({ name, value, id }: { name: string; value: string; id: string }) {
  return (
    <View style={styles.fact}>
      <Txt color="ink2" style={styles.name}>
        {name}
      </Txt>
      <Txt testID={`fact-${id}`} style={styles.value}>
        {value}
      </Txt>
    </View>
  );
}

const styles = StyleSheet.create({
  fact: { flexDirection: 'row', flexWrap: 'wrap', columnGap: 12 },
  name: { width: 130 },
  value: { flex: 1, minWidth: 180 },
});
