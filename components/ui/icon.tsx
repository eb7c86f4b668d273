import { View } from 'react-native';

import { lucide, type LucideName } from '@/components/ui/icon-set';
import { OwnGlyph, type OwnGlyphName } from '@/components/ui/own-glyph';
import { type ColorRole } from '@/components/ui/colors';
import { useTheme } from '@/components/ui/theme';

export type IconName = LucideName | OwnGlyphName;

interface IconProps {
  name: IconName;
  size?: number | undefined;
  /** a colour role or any colour */
  color?: ColorRole | (string & {}) | undefined;
  stroke?: number | undefined;
  /** only where no word stands beside it; without one the icon is hidden from screen readers */
  label?: string | undefined;
}

function isLucide(name: IconName): name is LucideName {
  return name in lucide;
}

/** A drawn sign on the 24 grid with a 2 px round stroke. */
export function Icon({ name, size = 22, color = 'ink', stroke = 2, label }: IconProps) {
  const theme = useTheme();
  const ink = color in theme.color ? theme.color[color as ColorRole] : color;
  const named =
    label === undefined ? { 'aria-hidden': true } : { role: 'img' as const, 'aria-label': label };
  const Drawing = isLucide(name) ? lucide[name] : null;
  return (
    <View {...named} style={{ width: size, height: size, flexShrink: 0 }}>
      {Drawing ? (
        <Drawing size={size} color={ink} strokeWidth={stroke} />
      ) : (
        <OwnGlyph name={name as OwnGlyphName} size={size} color={ink} />
      )}
    </View>
  );
}
