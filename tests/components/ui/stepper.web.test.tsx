import { act, useState } from 'react';

import { Stepper } from '@/components/ui/stepper';

import { click, find, mountWeb, press } from './mount-web';

const typed: string[] = [];
const steps: number[] = [];

function Page({ canLess = true, error }: { canLess?: boolean; error?: string }) {
  const [value, setValue] = useState('20');
  return (
    <Stepper
      label="Wedges"
      value={value}
      error={error}
      canLess={canLess}
      onChangeText={(text) => {
        typed.push(text);
        setValue(text);
      }}
      onStep={(by) => steps.push(by)}
    />
  );
}

beforeEach(() => {
  typed.length = 0;
  steps.length = 0;
});

it('steps by one with the buttons at its ends', async () => {
  const { unmount } = await mountWeb(<Page />);
  await click(find('[aria-label="More, Wedges"]'));
  await click(find('[aria-label="Less, Wedges"]'));
  expect(steps).toEqual([1, -1]);
  expect(typed).toEqual([]);
  await unmount();
});

it('takes what is typed as text, and steps with the arrow keys', async () => {
  const { unmount } = await mountWeb(<Page />);
  const input = find('input') as HTMLInputElement;
  await act(async () => {
    Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set?.call(input, '4 1/4');
    input.dispatchEvent(new Event('input', { bubbles: true }));
  });
  expect(typed).toEqual(['4 1/4']);
  expect(input.value).toBe('4 1/4');
  await press(input, 'ArrowUp');
  await press(input, 'ArrowDown');
  expect(steps).toEqual([1, -1]);
  await unmount();
});

it('does not step past its limit, and says so', async () => {
  const { unmount } = await mountWeb(<Page canLess={false} />);
  const less = find('[aria-label="Less, Wedges"]');
  expect(less.getAttribute('aria-disabled')).toBe('true');
  await click(less);
  await press(find('input'), 'ArrowDown');
  expect(steps).toEqual([]);
  await unmount();
});

it('ties its error to the field', async () => {
  const { unmount } = await mountWeb(<Page error="Too few. Use 5 or more." />);
  const input = find('input');
  expect(input.getAttribute('aria-invalid')).toBe('true');
  const text = document.getElementById(input.getAttribute('aria-describedby') ?? '');
  expect(text?.textContent).toBe('Too few. Use 5 or more.');
  await unmount();
});
