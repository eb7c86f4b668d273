import type { Caution, Mistake, Station, StepRole } from '../model/codes';

interface RoleFacts {
  station: Station;
  cautions: Caution[];
  mistakes: Mistake[];
}

/** What holds for every step of a role: its station, its cautions, and mistakes seen often. */
export const ROLE_FACTS: Record<StepRole, RoleFacts> = {
  strip: {
    station: 'table',
    cautions: ['bladeClosed', 'fingersClear'],
    mistakes: ['notSquare', 'bentStrip'],
  },
  length: { station: 'table', cautions: ['bladeClosed', 'fingersClear'], mistakes: ['notSquare'] },
  stack: { station: 'table', cautions: [], mistakes: ['layersSlip'] },
  cut: { station: 'table', cautions: ['bladeClosed'], mistakes: ['bentStrip'] },
  'tip-sew': { station: 'machine', cautions: ['needle'], mistakes: ['tipOffCentre'] },
  'tip-trim': { station: 'table', cautions: ['scissors'], mistakes: ['trimTooClose'] },
  'tip-turn': {
    station: 'iron',
    cautions: ['ironHeel', 'steam'],
    mistakes: ['tipNotTurned', 'tipOffCentre'],
  },
  pair: { station: 'machine', cautions: ['needle'], mistakes: ['seamTooWide'] },
  quarter: {
    station: 'machine',
    cautions: ['needle', 'pinsOut'],
    mistakes: ['shouldersApart', 'wrongOrder'],
  },
  half: {
    station: 'machine',
    cautions: ['needle', 'pinsOut'],
    mistakes: ['shouldersApart', 'wrongOrder'],
  },
  ring: { station: 'machine', cautions: ['needle', 'pinsOut'], mistakes: ['ringCups'] },
  'ring-press': {
    station: 'iron',
    cautions: ['ironHeel', 'ironClear'],
    mistakes: ['pressedStretch'],
  },
  'circle-cut': { station: 'table', cautions: ['scissors'], mistakes: ['circleSmall'] },
  'circle-turn': { station: 'iron', cautions: ['ironHeel', 'steam'], mistakes: ['circleSmall'] },
  'background-cut': {
    station: 'table',
    cautions: ['bladeClosed', 'fingersClear'],
    mistakes: ['notSquare'],
  },
  'background-fold': {
    station: 'iron',
    cautions: ['ironHeel', 'ironClear'],
    mistakes: ['foldOff'],
  },
  'stay-stitch': { station: 'machine', cautions: ['needle'], mistakes: ['holeStretched'] },
  applique: { station: 'machine', cautions: ['needle', 'pinsOut'], mistakes: ['appliqueOff'] },
  'block-trim': {
    station: 'table',
    cautions: ['bladeClosed', 'fingersClear'],
    mistakes: ['trimOffCentre'],
  },
};
