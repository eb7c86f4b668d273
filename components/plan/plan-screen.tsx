import { type Href, router, useLocalSearchParams } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { BlockDrawing } from '@/components/diagrams/block-drawing';
import { FabricTable } from '@/components/plan/fabric-table';
import { FactList } from '@/components/plan/fact-list';
import { listFacts, writeTotals } from '@/components/plan/plan-facts';
import { PlanSteps } from '@/components/plan/plan-steps';
import { PlanWarnings } from '@/components/plan/plan-warnings';
import { StackList } from '@/components/plan/stack-list';
import { StripList } from '@/components/plan/strip-list';
import { ProjectPage } from '@/components/projects/project-page';
import type { ProjectReading } from '@/components/projects/read-project';
import { Button } from '@/components/ui/button';
import { border, radius, space, useTheme } from '@/components/ui/theme';
import { Txt } from '@/components/ui/txt';

/** `/projects/[id]/plan`: the whole plan as it was made. */
export function PlanScreen() {
  const { id } = useLocalSearchParams<{ id: string }>();
  return (
    <ProjectPage
      id={id}
      title={() => 'The plan'}
      back={({ project }) => ({ label: project.name, href: `/projects/${project.id}` })}
      aside={(reading) => <Work reading={reading} />}
    >
      {(reading) => <Cloth reading={reading} />}
    </ProjectPage>
  );
}

function Section({ title, children }: { title: string; children: ReactNode }) {
  const { color } = useTheme();
  return (
    <View style={styles.section}>
      <Txt kind="section" heading={2} style={styles.title}>
        {title}
      </Txt>
      <View style={[styles.card, { backgroundColor: color.card, borderColor: color.line }]}>
        {children}
      </View>
    </View>
  );
}

function Cloth({ reading: { project, plan } }: { reading: ProjectReading }) {
  return (
    <View style={styles.column}>
      <View style={styles.picture}>
        <BlockDrawing plan={plan} size={256} letters />
      </View>
      <Section title={writeTotals(plan)}>
        <FabricTable plan={plan} />
      </Section>
      <PlanWarnings plan={plan} />
      <Section title="Sizes">
        <FactList facts={listFacts(plan)} />
      </Section>
      <Txt color="ink2">
        A plan stays as it was made, so that its counts stay true. Change it in a copy.
      </Txt>
      <Button
        label="Change it in a copy"
        icon="copy"
        onPress={() => router.push(`/projects/new?from=${project.id}` as Href)}
        testID="copy-project"
      />
    </View>
  );
}

function Work({ reading: { plan } }: { reading: ProjectReading }) {
  return (
    <View style={styles.column}>
      <Section title="Strips">
        <StripList plan={plan} />
      </Section>
      <Section title="Stacks">
        <StackList plan={plan} />
      </Section>
      <Section title="Steps">
        <PlanSteps plan={plan} />
      </Section>
    </View>
  );
}

const styles = StyleSheet.create({
  column: { gap: space[4], marginBottom: space[4] },
  section: { gap: space[2] },
  title: { paddingHorizontal: 8 },
  picture: { alignItems: 'center' },
  card: {
    borderWidth: border.hair,
    borderRadius: radius.card,
    paddingHorizontal: 14,
    paddingVertical: 8,
  },
});
