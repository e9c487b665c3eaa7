import { useEffect, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { text } from '@/shared/text/catalogue';
import { column, space } from '../theme/measures';
import { useBreakpoint } from '../theme/use-breakpoint';
import { Box } from './Box';
import { Link } from './Link';
import { NotPrinted } from './NotPrinted';
import { Text } from './Text';

type Props = {
  title: string;
  /** A line above the title: whose, when, or the way here. */
  kicker?: string;
  /** A line below the title. */
  lead?: string;
  back?: { href: string; label: string };
  /** The one main action. On a phone it stands in a bar within reach of the thumb. */
  action?: ReactNode;
  /** Beside the title: a tag, a filter. */
  beside?: ReactNode;
  /** From 1200 px at the right, below the rest otherwise. */
  aside?: ReactNode;
  /** Forms and text: no wider than is read well. */
  narrow?: boolean;
  children: ReactNode;
};

let announcedPath: string | undefined;

/** Names the tab; after a change of page the focus goes to the head, so that it is read out. */
function useArrival(title: string) {
  useEffect(() => {
    document.title = `${title} · ${text.shell.product}`;
    const path = window.location.pathname;
    if (announcedPath !== undefined && announcedPath !== path) {
      const head = document.getElementById('page-head');
      head?.setAttribute('tabindex', '-1');
      head?.focus({ preventScroll: true });
      window.scrollTo?.(0, 0);
    }
    announcedPath = path;
  }, [title]);
}

/** One head, one main action, and a way back. */
export function Page({ action, aside, narrow, children, ...head }: Props) {
  useArrival(head.title);
  const at = useBreakpoint();
  const inBar = at === 'phone' || at === 'wide phone';
  const padding = { padding: at === 'phone' ? space.l : space.xxl, paddingTop: inBar ? space.l : space.xl };
  return (
    <View id="page" style={[styles.page, padding]}>
      <Head {...head} action={inBar ? undefined : action} />
      <div className={aside !== undefined && at === 'broad' ? 'tk-split' : 'tk-parts'}>
        <View style={[styles.main, narrow && styles.narrow]}>{children}</View>
        {aside === undefined ? null : (
          <View style={at === 'broad' ? styles.aside : styles.main}>{aside}</View>
        )}
      </div>
      {inBar && action !== undefined ? <ActionBar>{action}</ActionBar> : null}
    </View>
  );
}

type HeadProps = Pick<Props, 'title' | 'kicker' | 'lead' | 'back' | 'beside' | 'action'>;

function Head({ title, kicker, lead, back, beside, action }: HeadProps) {
  return (
    <Box row wrap spread="between" align="end" gap="m">
      <Box gap="xs">
        {back === undefined ? null : (
          <NotPrinted>
            <Link
              href={back.href}
              label={`‹ ${back.label}`}
              name={text.ui.back(back.label)}
              tone="soft"
              strong={false}
            />
          </NotPrinted>
        )}
        {kicker === undefined ? null : <Text variant="soft">{kicker}</Text>}
        <Text variant="head" id="page-head">
          {title}
        </Text>
        {lead === undefined ? null : <Text variant="soft">{lead}</Text>}
      </Box>
      <Box row wrap gap="m">
        {beside}
        {action}
      </Box>
    </Box>
  );
}

/** The bar of the main action on a phone, above the bottom bar; `note` is a line above it. */
export function ActionBar({ children, note }: { children: ReactNode; note?: ReactNode }) {
  return (
    <>
      <div className="tk-action-bar-spacer" data-print="no" />
      <div className="tk-action-bar">
        <View style={styles.bar}>
          {note}
          {children}
        </View>
      </div>
    </>
  );
}

const styles = StyleSheet.create({
  page: { gap: space.l, width: '100%', maxWidth: 1320 },
  main: { gap: space.l, flexGrow: 1, flexShrink: 1, minWidth: 0 },
  narrow: { maxWidth: column, width: '100%' },
  aside: { width: 340, gap: space.l },
  bar: { gap: space.s, alignItems: 'stretch' },
});
