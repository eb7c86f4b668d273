import { act, useState } from 'react';

import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';

import { click, find, mountWeb, press } from './mount-web';

const answers = { keep: 0, take: 0 };

function Page() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button label="Miscut" testID="opener" onPress={() => setOpen(true)} />
      <Dialog
        open={open}
        title="Which piece was miscut?"
        text="1 piece comes off the count."
        onClose={() => setOpen(false)}
        actions={[
          { label: 'Keep 40', testID: 'keep', onPress: () => (answers.keep += 1) },
          { label: 'Take 1 off', testID: 'take', onPress: () => (answers.take += 1) },
        ]}
      />
    </>
  );
}

async function openDialog() {
  const mounted = await mountWeb(<Page />);
  await act(async () => find('[data-testid=opener]').focus());
  await click(find('[data-testid=opener]'));
  return mounted;
}

beforeEach(() => Object.assign(answers, { keep: 0, take: 0 }));

it('is a modal dialog named by its question', async () => {
  const { unmount } = await openDialog();
  const dialog = find('[role=dialog]');
  expect(dialog.getAttribute('aria-modal')).toBe('true');
  const name = document.getElementById(dialog.getAttribute('aria-labelledby') ?? '');
  expect(name?.textContent).toBe('Which piece was miscut?');
  await unmount();
});

it('puts the focus on the question, where no key of a pedal answers', async () => {
  const { unmount } = await openDialog();
  expect(document.activeElement?.textContent).toBe('Which piece was miscut?');
  for (const key of [' ', 'Enter', 'PageDown', 'ArrowRight', 'Backspace']) {
    const down = await press(document.activeElement ?? document.body, key);
    expect(down.defaultPrevented).toBe(true);
  }
  expect(answers).toEqual({ keep: 0, take: 0 });
  expect(find('[role=dialog]')).toBeTruthy();
  await unmount();
});

it('answers with the button that is pressed', async () => {
  const { unmount } = await openDialog();
  await click(find('[data-testid=take]'));
  expect(answers).toEqual({ keep: 0, take: 1 });
  await unmount();
});

it('keeps the focus inside', async () => {
  const { unmount } = await openDialog();
  await act(async () => find('[data-testid=opener]').focus());
  expect(find('[role=dialog]').contains(document.activeElement)).toBe(true);
  await unmount();
});

it('closes on Escape and gives the focus back', async () => {
  const { unmount } = await openDialog();
  await press(find('[role=dialog]'), 'Escape');
  expect(document.querySelector('[role=dialog]')).toBeNull();
  expect(document.activeElement).toBe(find('[data-testid=opener]'));
  expect(answers).toEqual({ keep: 0, take: 0 });
  await unmount();
});
