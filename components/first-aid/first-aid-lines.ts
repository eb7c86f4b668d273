export interface FirstAidGroup {
  title: string;
  lines: readonly string[];
}

/**
 * Sources: NHS-based advice on cuts and bleeding (Portsmouth City Council and United Lincolnshire
 * pages); a severed fingertip: First Aid for Life, a trainers' page.
 */
export const FIRST_AID: readonly FirstAidGroup[] = [
  {
    title: 'Now',
    lines: [
      'Something stuck in it? Leave it there. Press on either side of it.',
      'Otherwise press firmly with a clean pad for 10 minutes. Do not look in between.',
      'Raise the hand above the heart.',
      'If it bleeds through, leave the first pad on and add another.',
    ],
  },
  {
    title: 'Call the local emergency number',
    lines: [
      'When blood spurts, or will not stop.',
      'If a fingertip comes off: keep pressing and call. Then wrap the piece, unwashed, in a clean cloth in a bag, and lay the bag on ice. The piece never touches the ice.',
    ],
  },
  {
    title: 'Get medical help',
    lines: [
      'It still bleeds after 10 minutes.',
      'It is deep, or gapes.',
      'There is numbness, or a finger does not bend or straighten.',
      'Something is stuck in it.',
      'It is a bite or a dirty wound without tetanus cover.',
    ],
  },
];

export const FIRST_AID_SOURCES =
  'From NHS-based advice on cuts and bleeding (Portsmouth City Council, United Lincolnshire) and First Aid for Life. Trained people come first.';
