import { act } from 'react';

import { Txt } from '@/components/ui/txt';

import { find, mountWeb } from './mount-web';

it('builds an eighth and reads it plainly', async () => {
  const { host, unmount } = await mountWeb(<Txt>8 strips, 1⅝ yd</Txt>);
  expect(find('[role=img]').getAttribute('aria-label')).toBe('and 5 eighths');
  expect(host.textContent?.replace('\u00a0', ' ')).toBe('8 strips, 1 5⁄8 yd');
  await unmount();
});

it('draws the numerator smaller than its text and raised', async () => {
  const { unmount } = await mountWeb(<Txt kind="body">⅞ yd</Txt>);
  const over = find('[role=img] > :first-child');
  expect(over.textContent).toBe('7');
  expect(parseFloat(getComputedStyle(over).fontSize)).toBeCloseTo(16 * 0.64, 5);
  expect(parseFloat(getComputedStyle(over).top)).toBeLessThan(0);
  await unmount();
});

it('marks a heading with its level', async () => {
  const { unmount } = await mountWeb(<Txt heading={2}>By station</Txt>);
  expect(find('[role=heading]').getAttribute('aria-level')).toBe('2');
  await unmount();
});

const readAt = (rootPx: string) =>
  act(async () => {
    document.documentElement.style.fontSize = rootPx;
    window.dispatchEvent(new Event('resize'));
  });

it('grows with the browser’s own text size, also where a place asks for px of its own', async () => {
  const { unmount } = await mountWeb(
    <>
      <Txt testID="plain">Ready</Txt>
      <Txt testID="own" style={{ fontSize: 17, lineHeight: 23 }}>
        Ready
      </Txt>
    </>,
  );
  const sizes = () =>
    ['plain', 'own'].map((id) => getComputedStyle(find(`[data-testid=${id}]`)).fontSize);
  expect(sizes()).toEqual(['16px', '17px']);
  await readAt('32px');
  expect(sizes()).toEqual(['32px', '34px']);
  await readAt('');
  await unmount();
});
