import { View } from 'react-native';
import Svg from 'react-native-svg';

import { LayerRows } from '@/components/diagrams/parts/layers';
import { PaintDefs, usePaints } from '@/components/diagrams/parts/paints';
import type { RequestFabric } from '@/shared/model/plan-request';

interface Props {
  /** from the top, lightest first */
  layers: RequestFabric[];
  width: number;
  height: number;
}

/** The layers of a stack, one above the other, with their letters. */
export function StackPicture({ layers, width, height }: Props) {
  const paints = usePaints(layers);
  const letters = layers.map(({ letter }) => letter);
  return (
    <View
      accessible
      role="img"
      aria-label={`${layers.length} layers from the top: ${letters.join(', ')}`}
      style={{ width, height }}
    >
      <Svg width={width} height={height}>
        <PaintDefs paints={paints} />
        <LayerRows
          letters={letters}
          box={{ x: 1, y: 1, width: width - 2, height: height - 2 }}
          paints={paints}
        />
      </Svg>
    </View>
  );
}
