import { compare } from '@/shared/domain/money';
import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Figure } from '../ui/Figure';
import { Notice } from '../ui/Notice';
import { Sheet } from '../ui/Sheet';
import { Text } from '../ui/Text';
import type { StatementPage } from './StatementScreen';

const words = text.statements.page;
const papers = text.statements.document;
type Row = { key: string; label: string; amount: string; soft?: boolean; disputed?: boolean };

/** From payable to due now: what is taxed, the tax, what is held. With the notice that an adviser decides. */
export function TaxSheet({ page }: { page: StatementPage }) {
  const { currency, total, held, dueNow } = page;
  const rows: Row[] = [
    ...page.content.taxRows.flatMap(taxRowsOf),
    { key: 'total', label: papers.total, amount: total },
    ...(compare(held, '0') === 0
      ? []
      : [{ key: 'held', label: words.heldRow, amount: `-${held}`, disputed: true }]),
  ];
  return (
    <Box gap="s">
      <Sheet<Row>
        caption={words.taxHead}
        columns={[
          {
            key: 'what',
            head: words.taxRow,
            cell: ({ label, soft }) => <Text {...(soft ? { tone: 'soft' as const } : {})}>{label}</Text>,
          },
          {
            key: 'amount',
            head: currency,
            align: 'end',
            cell: ({ amount, soft, disputed }) => (
              <Figure
                money={amount}
                currency={currency}
                withoutCurrency
                plain
                {...(disputed ? { tone: 'disputed' as const } : soft ? { tone: 'soft' as const } : {})}
              />
            ),
          },
        ]}
        rows={rows}
        rowKey={(row) => row.key}
        sum={{
          what: <Text strong>{page.state === 'draft' ? words.wouldBeDueRow : words.dueRow}</Text>,
          amount: <Figure money={dueNow} currency={currency} withoutCurrency />,
        }}
      />
      <Notice kind="caution" live={false}>
        {text.statements.taxNotice}
      </Notice>
    </Box>
  );
}

function taxRowsOf(row: StatementPage['content']['taxRows'][number]): Row[] {
  const key = `${row.rate} ${row.treatment}`;
  return [
    { key: `${key} fees`, label: papers.taxFees, amount: row.fees, soft: true },
    { key: `${key} deposits`, label: papers.taxDeposits[row.treatment], amount: row.deposits, soft: true },
    { key: `${key} tax`, label: papers.taxAt(row.rate), amount: row.tax },
  ];
}
