import { useState } from 'react';

import { CheckRow } from '@/components/ui/check-row';
import { Toggle } from '@/components/ui/toggle';

import { find, mountWeb, press } from './mount-web';

function Page() {
  const [on, setOn] = useState(false);
  const [ticked, setTicked] = useState(false);
  return (
    <>
      <Toggle label="Click" value={on} onChange={setOn} />
      <CheckRow label="Mat flat" icon="mat" checked={ticked} onPress={() => setTicked(!ticked)} />
    </>
  );
}

it.each(['switch', 'checkbox'])('turns a %s with Space and with Enter, once each', async (role) => {
  const { unmount } = await mountWeb(<Page />);
  const control = find(`[role=${role}]`);
  const down = await press(control, ' ');
  expect(control.getAttribute('aria-checked')).toBe('true');
  expect(down.defaultPrevented).toBe(true); // or the page would scroll
  await press(control, 'Enter');
  expect(control.getAttribute('aria-checked')).toBe('false');
  await unmount();
});
