import { fireEvent, render, screen } from '@testing-library/react-native';

import { TallyZone, type TallyZoneProps } from '@/components/ui/tally-zone';

// what is drawn inside the zone is not read out: the zone's name says it
const HIDDEN = { includeHiddenElements: true };

function show(props: Partial<TallyZoneProps> = {}) {
  const order: string[] = [];
  const acts = {
    onPressIn: () => order.push('in'),
    onTap: () => order.push('tap'),
    onLongPress: () => order.push('hold'),
    onUnlock: () => order.push('unlock'),
  };
  render(
    <TallyZone
      station="table"
      shown={40}
      target={100}
      perTap={5}
      caption="of 100 pieces cut"
      label="40 of 100 pieces cut. Tap adds 5."
      ruler={{ tick: 5, longTick: 20 }}
      {...acts}
      {...props}
    />,
  );
  return order;
}

it('is one button that says the count and what a tap adds', () => {
  show();
  const buttons = screen.getAllByRole('button');
  expect(buttons).toHaveLength(1);
  expect(buttons[0]).toHaveAccessibleName('40 of 100 pieces cut. Tap adds 5.');
  expect(screen.getByTestId('tally-number', HIDDEN)).toHaveTextContent('40');
  expect(screen.getByText('5 a tap', HIDDEN)).toBeTruthy();
});

it('forwards press and release, also to a screen reader’s single click', () => {
  const order = show();
  fireEvent.press(screen.getByTestId('tally'));
  expect(order).toEqual(['in', 'tap']);
  fireEvent(screen.getByTestId('tally'), 'pressIn');
  fireEvent(screen.getByTestId('tally'), 'press');
  expect(order).toEqual(['in', 'tap', 'in', 'tap']);
});

it('neither counts nor opens the keypad while it is locked; a hold unlocks it', () => {
  const order = show({ locked: true });
  fireEvent.press(screen.getByTestId('tally'));
  expect(order).toEqual([]);
  fireEvent(screen.getByTestId('tally'), 'longPress');
  expect(order).toEqual(['unlock']);
  expect(screen.getByText('Hold to unlock', HIDDEN)).toBeTruthy();
});
