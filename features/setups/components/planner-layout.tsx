import { useRouter } from 'expo-router';
import Head from 'expo-router/head';
import { useRef, useState } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';

import { FindingList, PlanReader } from '@/features/plan';
import { useShop } from '@/features/session';
import { Stack } from '@/features/ui/card';
import { Heading } from '@/features/ui/text';
import { colors, measure, space, stroke } from '@/features/ui/tokens';
import { useLayout } from '@/features/ui/use-layout';
import { VerdictAnnouncer } from '@/features/ui/verdict';
import type { Setup } from '@/shared/contracts/setups';
import { SETUP_PARTS, type SetupPart } from '@/shared/domain/setups';

import { partAnswers } from '../part-answers';
import { usePlanner } from '../planner-context';
import type { SaveState } from '../use-autosave';
import { verdictCount } from '../verdict-count';
import { PART_WORDS } from '../words';
import { CutPart } from './cut-part';
import { DressPart } from './dress-part';
import { FindingsSheet } from './findings-sheet';
import { MachinePart } from './machine-part';
import { PlanPane } from './plan-pane';
import { PlanStrip } from './plan-strip';
import { PartTabs, PlannerTitle } from './planner-header';
import { SaveProblem } from './save-problem';
import { SetupMenu } from './setup-menu';
import { WheelPart } from './wheel-part';
import { WorkPart } from './work-part';

const PARTS: Record<SetupPart, () => React.ReactNode> = {
  work: WorkPart,
  machine: MachinePart,
  wheel: WheelPart,
  cut: CutPart,
  dress: DressPart,
};

interface PlannerLayoutProps {
  setupId: string;
  saved: string;
  /** The server knows this setup. */
  stored: boolean;
  saveState: SaveState;
  onRetry: () => void;
  onResolve: (theirs: Setup, keep: 'mine' | 'theirs') => void;
}

/** A phone shows one part and the verdict; a wide screen all five, and the plan beside them. */
export function PlannerLayout(props: PlannerLayoutProps) {
  const { wide } = useLayout();
  const { values, plan } = usePlanner();
  const { shop } = useShop();
  const router = useRouter();
  const [menu, setMenu] = useState(false);
  const back = () =>
    router.dismissTo({ pathname: '/shops/[shopId]/setups', params: { shopId: shop.id } });
  const title = (
    <PlannerTitle
      name={values.name}
      saved={props.saved}
      onBack={back}
      onMenu={() => setMenu(true)}
    />
  );
  const problem = (
    <SaveProblem
      state={props.saveState}
      values={values}
      onRetry={props.onRetry}
      onResolve={props.onResolve}
    />
  );
  return (
    <PlanReader units={values.units}>
      <Head>
        <title>{`${values.name} · Ringtrue`}</title>
      </Head>
      <View style={styles.screen}>
        {wide ? (
          <WideBody title={title} problem={problem} />
        ) : (
          <PhoneBody title={title} problem={problem} />
        )}
      </View>
      <VerdictAnnouncer verdict={plan.verdict} count={verdictCount(plan)} />
      <SetupMenu
        open={menu}
        onClose={() => setMenu(false)}
        setupId={props.setupId}
        stored={props.stored}
      />
    </PlanReader>
  );
}

interface BodyProps {
  title: React.ReactNode;
  problem: React.ReactNode;
}

function PhoneBody({ title, problem }: BodyProps) {
  const { plan, input, values } = usePlanner();
  const [part, setPart] = useState<SetupPart>('work');
  const [findings, setFindings] = useState(false);
  const Part = PARTS[part];
  // Notes wait behind the verdict: the first view stays calm.
  const first = plan.findings.find(({ level }) => level !== 'note');
  return (
    <>
      <View role="banner" style={styles.header}>
        {title}
        <PartTabs part={part} answers={partAnswers(plan, input, values.units)} onPart={setPart} />
      </View>
      <View role="main" style={styles.fill}>
        <ScrollView key={part} contentContainerStyle={styles.page}>
          {problem}
          {first ? (
            <View style={styles.bleed}>
              <FindingList findings={[first]} />
            </View>
          ) : null}
          <Part />
        </ScrollView>
      </View>
      <PlanStrip plan={plan} onVerdict={() => setFindings(true)} />
      <FindingsSheet open={findings} onClose={() => setFindings(false)} onPart={setPart} />
    </>
  );
}

function WideBody({ title, problem }: BodyProps) {
  const form = useRef<ScrollView>(null);
  const tops = useRef<Partial<Record<SetupPart, number>>>({});
  const showPart = (part: SetupPart) => form.current?.scrollTo({ y: tops.current[part] ?? 0 });
  return (
    <>
      <View role="banner" style={styles.header}>
        {title}
      </View>
      <View role="main" style={styles.panes}>
        <ScrollView ref={form} style={styles.form} contentContainerStyle={styles.page}>
          {problem}
          {SETUP_PARTS.map((part) => {
            const Part = PARTS[part];
            return (
              <View
                key={part}
                onLayout={({ nativeEvent }) => {
                  tops.current[part] = nativeEvent.layout.y;
                }}
              >
                <Stack>
                  <Heading>{PART_WORDS[part]}</Heading>
                  <Part />
                </Stack>
              </View>
            );
          })}
        </ScrollView>
        <ScrollView style={styles.plan} contentContainerStyle={styles.page}>
          <PlanPane onPart={showPart} />
        </ScrollView>
      </View>
    </>
  );
}

const styles = StyleSheet.create({
  screen: { flex: 1, backgroundColor: colors.page },
  header: { backgroundColor: colors.header },
  fill: { flex: 1 },
  page: { padding: space[4], gap: space[4] },
  bleed: { marginHorizontal: -space[4], marginTop: -space[4] },
  panes: { flex: 1, flexDirection: 'row' },
  form: {
    flexGrow: 0,
    flexShrink: 0,
    flexBasis: measure.form,
    borderRightWidth: stroke.hairline,
    borderRightColor: colors.rule,
  },
  plan: { flex: 1, backgroundColor: colors.sheet },
});
