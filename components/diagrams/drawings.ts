import type { ComponentType } from 'react';

import type { Scene } from '@/components/diagrams/parts/scene';
import {
  BackgroundCutDrawing,
  BackgroundFoldDrawing,
} from '@/components/diagrams/steps/background';
import { CircleCutDrawing, CircleTurnDrawing } from '@/components/diagrams/steps/circle';
import {
  AppliqueDrawing,
  BlockTrimDrawing,
  StayStitchDrawing,
} from '@/components/diagrams/steps/finish';
import { TipSewDrawing, TipTrimDrawing } from '@/components/diagrams/steps/fold-wedge';
import { HalfDrawing, QuarterDrawing, RingJoinDrawing } from '@/components/diagrams/steps/join';
import { LengthDrawing } from '@/components/diagrams/steps/length';
import { PairDrawing } from '@/components/diagrams/steps/pair';
import { RingPressDrawing } from '@/components/diagrams/steps/ring-press';
import { StackDrawing } from '@/components/diagrams/steps/stack';
import { StripDrawing } from '@/components/diagrams/steps/strip';
import { TipTurnDrawing } from '@/components/diagrams/steps/tip-turn';
import { TumblingDrawing } from '@/components/diagrams/steps/tumbling';
import type { Diagram } from '@/shared/model/codes';

/** The drawing of every diagram code that a plan may carry. */
export const DRAWINGS: Record<Diagram, ComponentType<Scene>> = {
  'ring.strip': StripDrawing,
  'ring.length': LengthDrawing,
  'ring.stack': StackDrawing,
  'ring.tumbling': TumblingDrawing,
  'ring.tip-sew': TipSewDrawing,
  'ring.tip-trim': TipTrimDrawing,
  'ring.tip-turn': TipTurnDrawing,
  'ring.pair': PairDrawing,
  'ring.quarter': QuarterDrawing,
  'ring.half': HalfDrawing,
  'ring.ring': RingJoinDrawing,
  'ring.ring-press': RingPressDrawing,
  'ring.circle-cut': CircleCutDrawing,
  'ring.circle-turn': CircleTurnDrawing,
  'ring.background-cut': BackgroundCutDrawing,
  'ring.background-fold': BackgroundFoldDrawing,
  'ring.stay-stitch': StayStitchDrawing,
  'ring.applique': AppliqueDrawing,
  'ring.block-trim': BlockTrimDrawing,
};
