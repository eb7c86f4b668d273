import { type ReactNode, useRef } from 'react';
import { ScrollView, StyleSheet, type Text, View } from 'react-native';
import { useSafeAreaInsets } from 'react-native-safe-area-context';

import { useToastOffset } from '@/components/providers/toast';
import { type BackLink, PageHeader } from '@/components/shell/page-header';
import type { Place } from '@/components/shell/places';
import { PlacesBar, PlacesRail } from '@/components/shell/places-nav';
import { TwoPanes } from '@/components/shell/two-panes';
import { usePageTitle } from '@/components/shell/use-page-title';
import { pageEdge, size, useTheme } from '@/components/ui/theme';
import { useLayout } from '@/components/ui/use-layout';

const NAMES: Record<Place, string> = { ready: 'Ready', projects: 'Projects', me: 'Me' };

/** One column is no wider than can be read with ease. */
const LINE_PX = 760;

interface PlacePageProps {
  place: Place;
  /** the place's own name when left out */
  title?: string | undefined;
  /** the chip that says where counts are kept */
  chip?: boolean | undefined;
  back?: BackLink | undefined;
  children: ReactNode;
  /** a second pane from 900 px of width on; below the rest on a phone */
  aside?: ReactNode;
  /** width of the first pane beside an aside; half of the page when left out */
  paneWidth?: number | undefined;
  /** false where the page itself scrolls */
  scroll?: boolean | undefined;
}

/** A page outside a station: title, contents and the places at the bottom or at the side. */
export function PlacePage(props: PlacePageProps) {
  const { place, title = NAMES[place], chip = false, back, children, aside, scroll = true } = props;
  const { color } = useTheme();
  const { kind } = useLayout();
  const { top } = useSafeAreaInsets();
  const heading = useRef<Text>(null);
  usePageTitle(title, heading);
  const wide = kind === 'wide' || kind === 'desk';
  useToastOffset(wide ? 0 : size.placesBar);

  const inside = (
    <>
      <PageHeader title={title} chip={chip} back={back} titleRef={heading} />
      {wide && aside ? (
        <TwoPanes left={children} right={aside} leftWidth={props.paneWidth} />
      ) : (
        <View style={[styles.column, !scroll && styles.still]}>
          {children}
          {aside}
        </View>
      )}
    </>
  );
  const limits = wide ? styles.wide : [styles.phone, { paddingTop: top + 6 }];
  return (
    <View style={[styles.page, wide && styles.sideways, { backgroundColor: color.paper }]}>
      {wide && <PlacesRail here={place} />}
      <View role="main" style={styles.main}>
        {scroll ? (
          <ScrollView contentContainerStyle={limits}>{inside}</ScrollView>
        ) : (
          <View style={[limits, styles.still]}>{inside}</View>
        )}
      </View>
      {!wide && <PlacesBar here={place} />}
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1 },
  sideways: { flexDirection: 'row' },
  main: { flex: 1, minWidth: 0 },
  still: { flex: 1 },
  column: { width: '100%', maxWidth: LINE_PX, flexGrow: 1 },
  phone: {
    width: '100%',
    maxWidth: LINE_PX,
    flexGrow: 1,
    alignSelf: 'center',
    paddingHorizontal: pageEdge.phone,
    paddingBottom: 20,
  },
  wide: {
    width: '100%',
    maxWidth: 1240,
    flexGrow: 1,
    alignSelf: 'center',
    paddingHorizontal: 32,
    paddingTop: 22,
    paddingBottom: 30,
  },
});
