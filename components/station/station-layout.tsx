import { useLayout } from '@/components/ui/use-layout';
import type { StationPartsProps } from '@/components/station/station-parts';
import { SidewaysStation } from '@/components/station/sideways-station';
import { TallStation } from '@/components/station/tall-station';
import { WideStation } from '@/components/station/wide-station';

/** A station page in the arrangement that the window has room for. */
export function StationLayout(props: StationPartsProps) {
  const { kind } = useLayout();
  if (kind === 'landscape') return <SidewaysStation {...props} />;
  return kind === 'phone' ? (
    <TallStation {...props} />
  ) : (
    <WideStation {...props} desk={kind === 'desk'} />
  );
}
