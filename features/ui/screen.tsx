import type { Href } from 'expo-router';
import { useRouter } from 'expo-router';
import Head from 'expo-router/head';
import type { ReactNode } from 'react';
import { ScrollView, StyleSheet, View } from 'react-native';

import { IconButton } from './button';
import { Small, Title } from './text';
import { colors, measure, space } from './tokens';
import { useLayout } from './use-layout';
import { web } from './web';

/** A page of words alone must be reached by the keyboard to be scrolled by it. */
const scrolledByKeys = web({ tabIndex: 0 });

interface ScreenProps {
  /** Name of the screen; also of the browser's tab. */
  title: string;
  /** A line over the title: "Setup · draft, saved 10:42". */
  over?: string;
  /** Where "back" leads, for screens that stand outside the tabs. */
  backTo?: Href;
  /** Goes back to wherever the reader came from, and to `backTo` where that is not known. */
  backToLast?: boolean;
  /** At the right of the header: one or two buttons (kind onEnamel). */
  actions?: ReactNode;
  /** Under the title, on the enamel: parts, tabs, a sentence. */
  header?: ReactNode;
  children: ReactNode;
  /** The second pane on a wide screen; under the first on a phone. */
  pane?: ReactNode;
  /** Stays at the bottom: the verdict strip, the main action. */
  strip?: ReactNode;
  /** Form keeps lines short; full is for tables and pictures. */
  width?: 'form' | 'full';
  /** Without side padding, for rows that run to the edges. */
  flush?: boolean;
}

/** The frame of a screen: enamel header, page, and what stays at the bottom. */
export function Screen({
  title,
  over,
  backTo,
  backToLast = false,
  actions,
  header,
  children,
  pane,
  strip,
  width = 'full',
  flush = false,
}: ScreenProps) {
  const { wide } = useLayout();
  const router = useRouter();
  const content = [styles.content, flush && styles.flush, width === 'form' && styles.form];
  const both = wide && pane !== undefined;
  return (
    <View style={styles.screen}>
      <Head>
        <title>{`${title} · Ringtrue`}</title>
      </Head>
      <View role="banner" style={styles.header}>
        <View style={styles.headerRow}>
          {backTo === undefined ? null : (
            <View style={styles.back}>
              <IconButton
                label="Back"
                icon="back"
                color="onEnamel"
                onPress={() =>
                  backToLast && router.canGoBack() ? router.back() : router.dismissTo(backTo)
                }
              />
            </View>
          )}
          <View style={styles.titles}>
            {over ? <Small tone="onEnamelSoft">{over}</Small> : null}
            <Title tone="onEnamel">{title}</Title>
          </View>
          {actions}
        </View>
        {header ? <View style={styles.under}>{header}</View> : null}
      </View>
      {both ? (
        <View role="main" style={styles.panes}>
          <ScrollView style={styles.first} contentContainerStyle={content} {...scrolledByKeys}>
            {children}
          </ScrollView>
          <ScrollView
            style={styles.second}
            contentContainerStyle={styles.content}
            {...scrolledByKeys}
          >
            {pane}
          </ScrollView>
        </View>
      ) : (
        <View role="main" style={styles.scroll}>
          <ScrollView contentContainerStyle={content} {...scrolledByKeys}>
            {children}
            {pane}
          </ScrollView>
        </View>
      )}
      {strip}
    </View>
  );
}

const styles = StyleSheet.create({
  screen: { flex: 1, minWidth: 0, backgroundColor: colors.page },
  header: { backgroundColor: colors.header, paddingVertical: space[2] },
  headerRow: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[2],
    minHeight: 48,
    paddingHorizontal: space[4],
  },
  under: { paddingHorizontal: space[4] },
  // The sign lines up with the text below, not its target.
  back: { marginLeft: -space[3] },
  titles: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 },
  panes: { flex: 1, flexDirection: 'row' },
  first: {
    flexGrow: 0,
    flexBasis: 420,
    borderRightWidth: 1,
    borderRightColor: colors.rule,
  },
  second: { flex: 1, backgroundColor: colors.sheet },
  scroll: { flex: 1 },
  content: {
    width: '100%',
    maxWidth: measure.page,
    padding: space[4],
    paddingBottom: space[8],
    gap: space[4],
  },
  form: { maxWidth: measure.text, alignSelf: 'center' },
  flush: { paddingHorizontal: 0, paddingTop: 0 },
});
