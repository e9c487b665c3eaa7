import { text } from '@/shared/text/catalogue';
import { formatAmount, formatMoney } from '@/shared/text/format';
import { reckonedTogether } from '@/shared/text/statement-words';
import { Box } from '../ui/Box';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Sheet } from '../ui/Sheet';
import { Text } from '../ui/Text';
import { DisputeTags } from './DisputeTags';
import { HowReckoned } from './HowReckoned';
import { lineGroups, type LineGroup } from './line-groups';
import { movementsHref } from './movements-href';
import type { StatementPage } from './StatementScreen';

const words = text.statements.page;

/** The money, row by row with what each was reckoned from; corrections of closed months after the month's own. */
export function MoneySheet({ page }: { page: StatementPage }) {
  const { content, currency, payable } = page;
  const groups = lineGroups(content.lines, currency);
  if (groups.length === 0) return <Text variant="soft">{words.noLines}</Text>;
  return (
    <Box gap="s">
      <Sheet<LineGroup>
        caption={words.money}
        columns={[
          {
            key: 'line',
            head: words.line,
            width: '28%',
            cell: (group) => <LineCell page={page} group={group} />,
          },
          {
            key: 'from',
            head: words.reckonedFrom,
            soft: true,
            cell: (group) => <Text variant="soft">{reckonedTogether(group.lines, content)}</Text>,
          },
          {
            key: 'amount',
            head: currency,
            align: 'end',
            cell: (group) => <AmountLink page={page} group={group} />,
          },
        ]}
        rows={groups}
        rowKey={(group) => group.key}
        sum={{
          line: <Text strong>{words.payable}</Text>,
          amount: <Figure money={payable} currency={currency} withoutCurrency />,
        }}
        stack
      />
      <HowReckoned page={page} groups={groups} />
    </Box>
  );
}

type CellProps = { page: StatementPage; group: LineGroup };

function LineCell({ page, group }: CellProps) {
  const [only, ...more] = group.lines;
  return (
    <Box gap="xs" align="start">
      <Text>{group.title}</Text>
      <DisputeTags page={page} lines={group.lines} />
      {page.mayDispute && only && more.length === 0 ? (
        <Link
          href={`/statements/${page.id}/dispute?line=${only.id}`}
          label={words.dispute}
          name={words.disputeLine(group.title)}
          size="small"
        />
      ) : null}
    </Box>
  );
}

function AmountLink({ page, group }: CellProps) {
  const [first] = group.lines;
  const shown = formatAmount(group.amount, page.currency);
  if (!first || first.component === 'credit')
    return <Figure money={group.amount} currency={page.currency} withoutCurrency plain />;
  const behind = {
    component: first.component,
    ...(first.correction ? { corrects: first.accountMonth } : {}),
  };
  return (
    <Link
      href={movementsHref(page.id, behind)}
      label={shown}
      name={words.movementsOf(`${group.title}, ${formatMoney(group.amount, page.currency)}`)}
      tone="text"
      strong={false}
    />
  );
}
