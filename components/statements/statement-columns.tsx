import type { StatementRow } from '@/shared/contracts/statements';
import { compare } from '@/shared/domain/money';
import { text } from '@/shared/text/catalogue';
import { formatDay, formatMonth } from '@/shared/text/format';
import type { Column } from '../tables/column';
import { CellText } from '../ui/CellText';
import { Figure } from '../ui/Figure';
import { StatementTag } from './StatementTag';

const words = text.statements.list;

/** The operator tells statements by partner and month, a partner by month. */
export function statementColumns(kind: 'operator' | 'partner'): Column<StatementRow>[] {
  const month: Column<StatementRow> = {
    key: 'month',
    head: words.month,
    cardRole: kind === 'partner' ? 'title' : 'line',
    cell: (row) => <CellText strong={kind === 'partner'}>{formatMonth(row.month)}</CellText>,
  };
  const partner: Column<StatementRow> = {
    key: 'partner',
    head: words.partner,
    cardRole: 'title',
    cell: (row) => <CellText strong>{row.partner.name}</CellText>,
  };
  return [
    ...(kind === 'operator' ? [partner, month] : [month]),
    { key: 'state', head: words.state, cardRole: 'tag', cell: (row) => <StatementTag row={row} /> },
    {
      key: 'answerBy',
      head: words.answerBy,
      cell: (row) => (row.objectionUntil && waits(row) ? formatDay(row.objectionUntil, 'short') : '–'),
    },
    {
      key: 'total',
      head: words.total,
      align: 'end',
      cell: (row) => <Figure money={row.total} currency={row.currency} plain />,
    },
    {
      key: 'held',
      head: words.held,
      align: 'end',
      cell: (row) =>
        compare(row.held, '0') === 0 ? (
          '–'
        ) : (
          <Figure money={row.held} currency={row.currency} tone="disputed" plain />
        ),
    },
    {
      key: 'dueNow',
      head: words.dueNow,
      align: 'end',
      cardRole: 'aside',
      cell: (row) => <Figure money={row.dueNow} currency={row.currency} />,
    },
  ];
}

const waits = ({ state, answer }: StatementRow) =>
  state === 'issued' && (answer === 'awaited' || answer === 'disputed');
