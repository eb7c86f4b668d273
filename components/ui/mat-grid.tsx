import { useId } from 'react';
import { StyleSheet, View } from 'react-native';
import { Defs, Path, Pattern, Rect, Svg } from 'react-native-svg';

interface MatGridProps {
  color: string;
  opacity?: number | undefined;
  /** px between lines: 36 is an inch of the mat */
  pitch?: number | undefined;
}

/** The cutting mat's lines, behind a zone or a diagram; never behind running text on paper. */
export function MatGrid({ color, opacity = 0.085, pitch = 36 }: MatGridProps) {
  const id = useId();
  return (
    <View style={styles.back} aria-hidden pointerEvents="none">
      <Svg width="100%" height="100%">
        <Defs>
          <Pattern id={id} width={pitch} height={pitch} patternUnits="userSpaceOnUse">
            <Path
              d={`M${pitch - 0.5} 0V${pitch}M0 ${pitch - 0.5}H${pitch}`}
              stroke={color}
              strokeWidth={1}
              strokeOpacity={opacity}
            />
          </Pattern>
        </Defs>
        <Rect width="100%" height="100%" fill={`url(#${id})`} />
      </Svg>
    </View>
  );
}

const styles = StyleSheet.create({
  back: { position: 'absolute', top: 0, right: 0, bottom: 0, left: 0 },
});
