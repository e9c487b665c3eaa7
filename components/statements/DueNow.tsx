import { compare } from '@/shared/domain/money';
import { text } from '@/shared/text/catalogue';
import { formatMoney } from '@/shared/text/format';
import { useSignedIn } from '../data/use-session';
import { useIsWide } from '../theme/use-breakpoint';
import { Box } from '../ui/Box';
import { Figure } from '../ui/Figure';
import { Text } from '../ui/Text';
import type { StatementPage } from './StatementScreen';

const words = text.statements.page;

/** The figure that matters, and what of the statement is held back while it is disputed. */
export function DueNow({ page }: { page: StatementPage }) {
  const { state, dueNow, held, currency } = page;
  const { company } = useSignedIn();
  const issued = compare(dueNow, '0') < 0 ? words.inFavour[company.kind] : words.dueNow;
  const wide = useIsWide();
  return (
    <Box gap="xs" align={wide ? 'end' : 'start'}>
      <Text variant="soft">{state === 'draft' ? words.wouldBeDue : issued}</Text>
      <Figure money={dueNow} currency={currency} size="figure" />
      {compare(held, '0') === 0 ? null : (
        <Text tone="disputed">{words.heldNote(formatMoney(held, currency))}</Text>
      )}
    </Box>
  );
}
