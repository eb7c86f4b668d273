import { useId } from 'react';
import { View } from 'react-native';
import Svg, { Circle, Defs, G, Path, Rect, Text } from 'react-native-svg';

import { clothOf, ClothPattern } from '@/components/ui/cloth';
import { useTheme } from '@/components/ui/theme';
import { font } from '@/components/ui/type';
import type { RequestFabric } from '@/shared/model/plan-request';

const LETTER_PX = { 26: 13, 34: 15, 44: 18, 52: 19 } as const;
const STAR = 'M0-5.4 1.6-1.9 5.2-1.7 2.5.9 3.3 4.5 0 2.6-3.3 4.5-2.5.9-5.2-1.7-1.6-1.9Z';

interface Props {
  fabric: RequestFabric;
  size: 26 | 34 | 44 | 52;
  /** draws a star on its corner */
  dominant?: boolean;
  /** what is read out; "" where the words beside it already say it */
  label?: string;
}

/** A fabric's own colour, print and letter; never tinted, in Day and in Lamp. */
export function Swatch({ fabric, size, dominant = false, label }: Props) {
  const theme = useTheme();
  const id = `swatch-${useId().replace(/\W/g, '')}`;
  const { cloth, letter } = clothOf(fabric);
  const words = label ?? `${fabric.letter}, ${fabric.name}${dominant ? ', dominant' : ''}`;
  const letterPx = LETTER_PX[size];
  const text = {
    x: size / 2,
    y: size / 2 + letterPx * 0.36,
    textAnchor: 'middle' as const,
    fontSize: letterPx,
    fontFamily: font.bold,
  };
  return (
    <View
      {...(words === ''
        ? { 'aria-hidden': true }
        : { accessible: true, role: 'img' as const, 'aria-label': words })}
      style={{ width: size, height: size, flexShrink: 0 }}
    >
      <Svg width={size} height={size} style={{ overflow: 'visible' }}>
        <Defs>
          <ClothPattern id={id} fabric={fabric} />
        </Defs>
        <Rect
          x={0.75}
          y={0.75}
          width={size - 1.5}
          height={size - 1.5}
          rx={size / 4}
          fill={`url(#${id})`}
          stroke={theme.color.edge}
          strokeWidth={1.5}
        />
        <Text
          {...text}
          fill={cloth}
          stroke={cloth}
          strokeWidth={letterPx / 2}
          strokeLinejoin="round"
        >
          {fabric.letter}
        </Text>
        <Text {...text} fill={letter}>
          {fabric.letter}
        </Text>
        {dominant && <Star at={size - 3} color={theme.color.weldInk} on={theme.color.card} />}
      </Svg>
    </View>
  );
}

function Star({ at, color, on }: { at: number; color: string; on: string }) {
  return (
    <>
      <Circle cx={at} cy={3} r={8} fill={on} stroke={color} strokeWidth={1} />
      <G x={at} y={3}>
        <Path d={STAR} fill={color} />
      </G>
    </>
  );
}
