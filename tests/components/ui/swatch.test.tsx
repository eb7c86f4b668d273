import { render, screen } from '@testing-library/react-native';

import { Swatch } from '@/components/ui/swatch';
import { fabricsFor } from '../../support/ring-plan';

const [fabric] = fabricsFor(1);

describe('Swatch', () => {
  it('is named by letter and cloth, and says which one is dominant', () => {
    if (!fabric) throw new Error('no fabric');
    const { rerender } = render(<Swatch fabric={fabric} size={44} />);
    expect(screen.getByRole('img', { name: 'A, Cloth A' })).toBeTruthy();
    rerender(<Swatch fabric={fabric} size={44} dominant />);
    expect(screen.getByRole('img', { name: 'A, Cloth A, dominant' })).toBeTruthy();
  });

  it('is left out for a reader where the words beside it say it already', () => {
    if (!fabric) throw new Error('no fabric');
    render(<Swatch fabric={fabric} size={26} label="" />);
    expect(screen.queryByLabelText(/A/)).toBeNull();
  });
});
