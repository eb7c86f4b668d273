import { useState } from 'react';

import { Section } from '@/components/me/section';
import { ChoiceBar } from '@/components/ui/choice-bar';
import { Stepper } from '@/components/ui/stepper';
import { Toggle } from '@/components/ui/toggle';
import { Txt } from '@/components/ui/txt';
import type { Settings } from '@/shared/model/settings';
import { defaultCap } from '@/shared/stacks/default-cap';

const BLADES = [
  { value: '18', label: '18 mm' },
  { value: '28', label: '28 mm' },
  { value: '45', label: '45 mm' },
  { value: '60', label: '60 mm' },
] as const;
const MOST_LAYERS = 16;

interface BladeSettingsProps {
  settings: Settings;
  change: (patch: Partial<Settings>) => void;
}

/** The blade, and the most layers it cuts: the cautious number or her own. */
export function BladeSettings({ settings, change }: BladeSettingsProps) {
  const { bladeMm, cap } = settings;
  const cautious = defaultCap(bladeMm);
  const blade = (value: string) => {
    const chosen = ([18, 28, 45, 60] as const).find((mm) => String(mm) === value);
    if (chosen !== undefined) change({ bladeMm: chosen });
  };
  return (
    <Section title="Blade and layers">
      <ChoiceBar
        label="Blade"
        options={BLADES}
        value={BLADES.find(({ value }) => value === String(bladeMm))?.value ?? '45'}
        onChange={blade}
        testID="blade"
      />
      <Toggle
        label="My own number of layers"
        hint={`Otherwise ${cautious} with a ${bladeMm} mm blade`}
        value={cap !== null}
        onChange={(own) => change({ cap: own ? cautious : null })}
        testID="own-cap"
      />
      {cap === null ? null : <OwnCap cap={cap} cautious={cautious} change={change} />}
      <Txt kind="small" color="ink2">
        New plans begin with these. Plans you have keep theirs.
      </Txt>
    </Section>
  );
}

interface OwnCapProps {
  cap: number;
  cautious: number;
  change: BladeSettingsProps['change'];
}

function OwnCap({ cap, cautious, change }: OwnCapProps) {
  const [text, setText] = useState(String(cap));
  const typed = /^\d+$/.test(text) ? Number(text) : 0;
  const fits = typed >= 1 && typed <= MOST_LAYERS;
  const set = (next: string) => {
    setText(next);
    const count = /^\d+$/.test(next) ? Number(next) : 0;
    if (count >= 1 && count <= MOST_LAYERS) change({ cap: count });
  };
  return (
    <>
      <Stepper
        label="Layers at most"
        value={text}
        onChangeText={set}
        onStep={(by) => set(String(Math.min(MOST_LAYERS, Math.max(1, cap + by))))}
        canLess={cap > 1}
        canMore={cap < MOST_LAYERS}
        error={fits ? undefined : `Not a number of layers. Use 1 to ${MOST_LAYERS}.`}
        testID="cap"
      />
      {cap > cautious ? (
        <Txt kind="small" color="weldInk" live="polite">
          {`Above the cautious ${cautious}. Cuts grow less accurate as the stack rises.`}
        </Txt>
      ) : null}
    </>
  );
}
