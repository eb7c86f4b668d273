import { type Ref, useRef, useState } from 'react';
import { ScrollView, StyleSheet, type Text, View } from 'react-native';
import { useSafeAreaInsets } from 'react-native-safe-area-context';

import { useSettings } from '@/components/providers/settings';
import { CAUTION_GROUPS, DEFERENCE } from '@/components/safety/cautions';
import { CautionList } from '@/components/safety/caution-list';
import { ADULT_LINE, checkLines } from '@/components/safety/check-lines';
import { canSkip, type CuttingVisit } from '@/components/safety/safety-rules';
import { StationHeader } from '@/components/station/station-header';
import type { StepReading } from '@/components/station/step-reading';
import { madeWord, unitWord } from '@/components/steps/messages';
import { Button } from '@/components/ui/button';
import { CheckRow } from '@/components/ui/check-row';
import { Icon } from '@/components/ui/icon';
import { LinkText } from '@/components/ui/link-text';
import { useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';
import { font } from '@/components/ui/type';

interface SafetyCheckProps {
  reading: StepReading;
  titleRef: Ref<Text>;
  onOpen: (how: CuttingVisit['opened'], adult: boolean) => void;
}

/** Before a cutting visit: lines to tick. Counting goes on below it by key or pedal. */
export function SafetyCheck({ reading, titleRef, onOpen }: SafetyCheckProps) {
  const { color } = useTheme();
  const { under18 } = useSettings().settings;
  const { top, bottom } = useSafeAreaInsets();
  const [ticked, setTicked] = useState<readonly string[]>([]);
  const [more, setMore] = useState(false);
  const scroll = useRef<ScrollView>(null);
  const lines = checkLines(under18);
  const missing = lines.filter(({ id }) => !ticked.includes(id));
  const toggle = (id: string) => {
    setTicked((before) =>
      before.includes(id) ? before.filter((each) => each !== id) : [...before, id],
    );
  };
  const start = () => {
    if (missing.length === 0) onOpen('checked', ticked.includes(ADULT_LINE.id));
    else scroll.current?.scrollTo({ y: 0, animated: false });
  };
  return (
    <View
      role="main"
      testID="safety-check"
      style={[styles.page, { backgroundColor: color.paper, paddingTop: top }]}
    >
      <CheckHeader reading={reading} />
      <ScrollView ref={scroll} contentContainerStyle={styles.inside}>
        <CheckTitle titleRef={titleRef} all={lines.length} done={lines.length - missing.length} />
        <View style={{ borderTopWidth: 1, borderColor: color.line }}>
          {lines.map(({ id, text, icon }) => (
            <CheckRow
              key={id}
              label={text}
              icon={icon}
              checked={ticked.includes(id)}
              next={missing[0]?.id === id}
              onPress={() => toggle(id)}
              testID={`check-${id}`}
            />
          ))}
        </View>
        <Beneath more={more} onMore={() => setMore(!more)} />
        <CountLine reading={reading} />
      </ScrollView>
      <View style={[styles.buttons, { paddingBottom: 14 + bottom }]}>
        <Button
          label={startLabel(missing.length)}
          kind="main"
          waiting={missing.length > 0}
          onPress={start}
          testID="check-start"
          style={styles.main}
        />
        {canSkip(under18) ? (
          <Button
            label="Skip once"
            kind="second"
            onPress={() => onOpen('skipped', false)}
            testID="check-skip"
            style={styles.skip}
          />
        ) : null}
      </View>
    </View>
  );
}

function startLabel(missing: number): string {
  if (missing === 0) return 'Start cutting';
  return missing === 1 ? '1 check to go' : `${missing} checks to go`;
}

function CheckHeader({ reading: { project, step } }: { reading: StepReading }) {
  return (
    <StationHeader
      projectId={project.id}
      projectName={project.name}
      stepText={`Step ${step.position} of ${project.steps.length}`}
      tools={null}
      onSteps={null}
    />
  );
}

function CheckTitle(props: { titleRef: Ref<Text>; all: number; done: number }) {
  const { titleRef, all, done } = props;
  return (
    <View style={styles.title}>
      <Txt kind="display" heading={1} tabIndex={-1} ref={titleRef} style={styles.heading}>
        Before you cut
      </Txt>
      <View style={styles.sub}>
        <Txt>{`${all} checks, about 20 seconds`}</Txt>
        <Txt color="mossInk" style={styles.strong}>
          {`${done} of ${all}`}
        </Txt>
      </View>
    </View>
  );
}

/** First aid and supervision in a line each; the rest of the cautions behind More. */
function Beneath({ more, onMore }: { more: boolean; onMore: () => void }) {
  const group = CAUTION_GROUPS[0];
  return (
    <View style={styles.beneath}>
      <View style={styles.note}>
        <Icon name="firstAid" size={22} color="madderInk" />
        <View style={styles.grow}>
          <Txt>If someone is cut: press firmly with a clean pad and raise it.</Txt>
          <LinkText href="/first-aid">More first aid</LinkText>
        </View>
      </View>
      <View style={styles.note}>
        <Icon name="people" size={22} color="woadInk" />
        <Txt style={styles.grow}>
          Supervise children. A child cuts only with an adult beside them.
        </Txt>
      </View>
      <Button
        label={more ? 'Less' : 'More'}
        kind="quiet"
        small
        onPress={onMore}
        testID="check-more"
        style={styles.more}
      />
      {more && group ? (
        <>
          <CautionList group={group} sources={false} />
          <Txt kind="small" color="ink2">
            {DEFERENCE}
          </Txt>
        </>
      ) : null}
    </View>
  );
}

/** Keys count while the check shows, so the count shows too. */
function CountLine({ reading: { step, progress } }: { reading: StepReading }) {
  return (
    <Txt kind="small" color="ink2" live="polite" testID="check-count" style={styles.count}>
      {`${progress.good} of ${step.target} ${unitWord(step.role, step.target)} ${madeWord(step.role)}. Pedal or Space counts.`}
    </Txt>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1 },
  inside: { width: '100%', maxWidth: 640, alignSelf: 'center', paddingBottom: 12 },
  title: { paddingHorizontal: 20, paddingTop: 4, paddingBottom: 12, gap: 6 },
  heading: { borderRadius: 6 },
  sub: { flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'space-between', columnGap: 12 },
  strong: { fontFamily: font.bold },
  beneath: { paddingHorizontal: 20, paddingTop: 12, gap: 10 },
  note: { flexDirection: 'row', gap: 12 },
  grow: { flex: 1 },
  more: { alignSelf: 'flex-start' },
  count: { paddingHorizontal: 20, paddingTop: 10 },
  buttons: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    gap: 10,
    width: '100%',
    maxWidth: 640,
    alignSelf: 'center',
    paddingHorizontal: 12,
    paddingTop: 10,
  },
  main: { flexGrow: 2, flexBasis: 180 },
  skip: { flexGrow: 1, flexBasis: 110 },
});
