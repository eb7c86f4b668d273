import { StyleSheet, View } from 'react-native';

import { BladeSettings } from '@/components/me/blade-settings';
import { CountingSettings } from '@/components/me/counting-settings';
import { ExampleRow } from '@/components/me/example-row';
import { Section } from '@/components/me/section';
import { ThisDevice } from '@/components/me/this-device';
import { useSettings } from '@/components/providers/settings';
import { PlacePage } from '@/components/shell/place-page';
import { StoreGate } from '@/components/shell/store-gate';
import { useSaveCopy } from '@/components/shell/use-save-copy';
import { Button } from '@/components/ui/button';
import { ChoiceBar } from '@/components/ui/choice-bar';
import { LinkText } from '@/components/ui/link-text';
import { Toggle } from '@/components/ui/toggle';

const THEMES = [
  { value: 'device', label: 'Device' },
  { value: 'day', label: 'Day' },
  { value: 'lamp', label: 'Lamp' },
] as const;

/** `/me`: how Matside looks, cuts and counts for this maker, and what this device keeps. */
export function MeScreen() {
  const { settings, change } = useSettings();
  return (
    <PlacePage place="me" chip>
      <View style={styles.page}>
        <Section title="Look">
          <ChoiceBar
            label="Theme"
            options={THEMES}
            value={settings.theme}
            onChange={(theme) => change({ theme })}
            testID="theme"
          />
          <Toggle
            label="Left-handed"
            hint="Mirrors ruler, cut order and controls"
            value={settings.leftHanded}
            onChange={(leftHanded) => change({ leftHanded })}
            testID="left-handed"
          />
        </Section>
        <BladeSettings settings={settings} change={change} />
        <CountingSettings settings={settings} change={change} />
        <Section title="Safety">
          <Toggle
            label="Someone under 18 cuts here"
            hint="The check before cutting then asks for an adult beside them"
            value={settings.under18}
            onChange={(under18) => change({ under18 })}
            testID="under-18"
          />
          <LinkText href="/me/safety">Safety, with sources</LinkText>
          <LinkText href="/first-aid">First aid</LinkText>
        </Section>
        <StoreGate>
          <Section title="Your projects">
            <ExampleRow />
            <SaveCopy />
          </Section>
        </StoreGate>
        <ThisDevice />
      </View>
    </PlacePage>
  );
}

function SaveCopy() {
  const saveCopy = useSaveCopy();
  return (
    <Button
      label="Save a copy"
      icon="download"
      kind="second"
      onPress={() => void saveCopy()}
      testID="save-copy"
      style={styles.button}
    />
  );
}

const styles = StyleSheet.create({
  page: { gap: 24, paddingHorizontal: 8 },
  button: { alignSelf: 'flex-start' },
});
