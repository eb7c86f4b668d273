import { Section } from '@/components/me/section';
import { Toggle } from '@/components/ui/toggle';
import type { Settings } from '@/shared/model/settings';

interface CountingSettingsProps {
  settings: Settings;
  change: (patch: Partial<Settings>) => void;
}

/** What is felt and heard at a count. */
export function CountingSettings({ settings, change }: CountingSettingsProps) {
  return (
    <Section title="Counting">
      <Toggle
        label="Buzz"
        hint="A short buzz at each count, where the device has one"
        value={settings.haptics}
        onChange={(haptics) => change({ haptics })}
        testID="haptics"
      />
      <Toggle
        label="Click"
        hint="A short click at each count"
        value={settings.click}
        onChange={(click) => change({ click })}
        testID="click"
      />
      <Toggle
        label="Say the count"
        hint="“40 of 100”, in the device’s voice"
        value={settings.spokenCount}
        onChange={(spokenCount) => change({ spokenCount })}
        testID="spoken-count"
      />
    </Section>
  );
}
