import { clothOf } from '@/components/ui/cloth';

const fabric = (letter: string, colour: string, role: 'wedge' | 'background' = 'wedge') => ({
  letter,
  colour,
  role,
});

describe('clothOf', () => {
  it('keeps the maker’s colour and the inks mixed for a known dye', () => {
    expect(clothOf(fabric('C', '#86AAB8'))).toEqual({
      cloth: '#86AAB8',
      print: '#B9D0D8',
      letter: '#17232A',
      printKind: 'waves',
    });
  });

  it('computes a print and a letter for any other colour', () => {
    const cloth = clothOf(fabric('A', '#123456'));
    expect(cloth.letter).toBe('#FFFAF0');
    expect(cloth.print).not.toBe('#123456');
  });

  it('gives five neighbouring letters five different prints, and the background its own', () => {
    const kinds = ['A', 'B', 'C', 'D', 'E'].map((l) => clothOf(fabric(l, '#86AAB8')).printKind);
    expect(new Set(kinds).size).toBe(5);
    expect(kinds).not.toContain(clothOf(fabric('E', '#DDE0D8', 'background')).printKind);
  });
});
