/** A caution in our words, and where it comes from. */
export interface SafetyCaution {
  text: string;
  source: Source;
}

export type Source = 'supervised' | 'bladeHandling' | 'practice' | 'rest' | 'sleep';

export const SOURCES: Record<Source, string> = {
  supervised: 'University of Kentucky 4-H, sheet 4JF-12PB: supervised use of rotary cutters.',
  bladeHandling:
    'University of Southern California, Environmental Health and Safety: cutting safety; Canadian Centre for Occupational Health and Safety: sharp blades.',
  practice: 'Common practice in sewing rooms; no single source.',
  rest: 'Stanford University Environmental Health and Safety; Health and Safety Executive: screen work; Galinsky and others 2007 (NIOSH), data-entry work. None was measured on cutting cloth.',
  sleep: 'American Academy of Pediatrics: advice on infant sleep.',
};

export interface CautionGroup {
  title: string;
  cautions: readonly SafetyCaution[];
}

const BEFORE_CUTTING: CautionGroup = {
  title: 'Before you cut',
  cautions: [
    { text: 'Blade closed or locked whenever it leaves the hand.', source: 'bladeHandling' },
    { text: 'Cut away from the body, never toward the hand.', source: 'bladeHandling' },
    {
      text: 'Holding hand flat, fingers clear of the ruler’s edge. A ruler guard or non-slip dots help.',
      source: 'practice',
    },
    {
      text: 'Stand. Mat flat at about hip height, good light, dry hands.',
      source: 'bladeHandling',
    },
    { text: 'Closed shoes.', source: 'practice' },
    {
      text: 'Children and pets away. A child cuts only with an adult beside them.',
      source: 'supervised',
    },
    {
      text: 'A sharp blade. A dull one needs force and slips: change it at the first skipped threads.',
      source: 'bladeHandling',
    },
    {
      text: 'Never catch a falling cutter. A cut-resistant glove on the holding hand helps.',
      source: 'practice',
    },
    {
      text: 'Set the blade for the left hand if that is the hand you cut with.',
      source: 'practice',
    },
    {
      text: 'Used blades go in a closed, labelled hard case, then by the local rules for sharps or metal.',
      source: 'bladeHandling',
    },
    { text: 'Stop when tired. Do not reach over an open blade.', source: 'practice' },
    {
      text: 'Layers: 4 with a 45 mm blade, 6 with 60 mm, 2 with 28 mm, 1 with 18 mm. Practised cutters report up to 8 and 12. The cuts grow less accurate as the stack rises.',
      source: 'practice',
    },
  ],
};

const IRON_AND_MACHINE: CautionGroup = {
  title: 'At the iron and the machine',
  cautions: [
    {
      text: 'Iron on its heel, off when you leave, cord out of the way. Steam burns.',
      source: 'practice',
    },
    {
      text: 'Never iron over a plastic ruler or a mat. Mats warp: keep them from heat, sun and hot cups.',
      source: 'practice',
    },
    {
      text: 'Fusible web by its maker’s heat and time, with a pressing cloth and fresh air.',
      source: 'practice',
    },
    {
      text: 'Fingers behind the needle bar’s line. Foot off the pedal to thread or to change the needle; unplug to change the lamp.',
      source: 'practice',
    },
    {
      text: 'Do not sew over pins: a needle can break, so mind your eyes. Pick up every dropped pin and needle.',
      source: 'practice',
    },
    { text: 'Dye, starch spray and adhesive in fresh air.', source: 'practice' },
    {
      text: 'In a hall: cords taped down, one person a mat. Whoever teaches shows the cutter first and checks shared blades.',
      source: 'practice',
    },
  ],
};

const FINISHED_QUILT: CautionGroup = {
  title: 'The finished quilt',
  cautions: [
    {
      text: 'No quilt, loose cloth or padding in a cot or where a baby under 12 months sleeps.',
      source: 'sleep',
    },
    { text: 'Buttons, beads and bows are choking hazards for small children.', source: 'practice' },
    { text: 'On the care label: wash as the cloth was treated.', source: 'practice' },
  ],
};

const REST: CautionGroup = {
  title: 'Rest',
  cautions: [
    {
      text: 'About 2 minutes every 30, and short breaks of 30 to 60 seconds in between; others advise 5 to 10 minutes in every hour.',
      source: 'rest',
    },
  ],
};

export const CAUTION_GROUPS: readonly CautionGroup[] = [
  BEFORE_CUTTING,
  IRON_AND_MACHINE,
  FINISHED_QUILT,
  REST,
];

/** Said once on the check and once in Me, Safety. */
export const DEFERENCE =
  'These are the usual cautions, not medical or legal advice. What your tools’ makers, your local rules and trained people say comes first.';
