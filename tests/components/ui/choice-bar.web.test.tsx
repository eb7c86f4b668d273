import { act, useState } from 'react';

import { ChoiceBar } from '@/components/ui/choice-bar';

import { click, find, mountWeb, press } from './mount-web';

const TIPS = [
  { value: 'pointed', label: 'Pointed' },
  { value: 'rounded', label: 'Rounded' },
  { value: 'flat', label: 'Flat' },
] as const;

function Page() {
  const [tip, setTip] = useState<(typeof TIPS)[number]['value']>('pointed');
  return <ChoiceBar label="Tip" options={TIPS} value={tip} onChange={setTip} />;
}

const chosen = () => find('[role=radio][aria-checked=true]').textContent;

it('is a named radio group with one stop for the Tab key', async () => {
  const { unmount } = await mountWeb(<Page />);
  const group = find('[role=radiogroup]');
  const name = document.getElementById(group.getAttribute('aria-labelledby') ?? '');
  expect(name?.textContent).toBe('Tip');
  expect(group.querySelectorAll('[role=radio][tabindex="0"]')).toHaveLength(1);
  await unmount();
});

it('chooses with a press', async () => {
  const { host, unmount } = await mountWeb(<Page />);
  const flat = host.querySelectorAll<HTMLElement>('[role=radio]')[2];
  await click(flat ?? document.body);
  expect(chosen()).toBe('Flat');
  await unmount();
});

it('moves and chooses with the arrow keys, round the ends, taking the focus along', async () => {
  const { unmount } = await mountWeb(<Page />);
  await act(async () => find('[role=radio][aria-checked=true]').focus());
  for (const [key, now] of [
    ['ArrowRight', 'Rounded'],
    ['ArrowDown', 'Flat'],
    ['ArrowRight', 'Pointed'],
    ['ArrowLeft', 'Flat'],
  ] as const) {
    await press(document.activeElement ?? document.body, key);
    expect(chosen()).toBe(now);
    expect(document.activeElement?.textContent).toBe(now);
  }
  await unmount();
});
