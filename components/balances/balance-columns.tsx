import type { BalancePart, BalanceRow } from '@/shared/contracts/balances';
import { text } from '@/shared/text/catalogue';
import type { Column } from '../tables/column';
import { Figure } from '../ui/Figure';
import { PartLink } from '../ui/PartLink';
import { balanceHref } from './balance-href';

const head = text.balances.column;

/** Every figure opens the movements that it is made of. */
export function balanceColumns({
  kind,
  asOf,
}: {
  kind: 'operator' | 'partner';
  asOf: string | undefined;
}): Column<BalanceRow>[] {
  const opened = (row: BalanceRow, part: BalancePart, units: number) => (
    <PartLink
      href={balanceHref(row, { part, asOf })}
      name={`${row.company}, ${row.typeName}: ${text.balances.part[part]}`}
      units={units}
    />
  );
  const company: Column<BalanceRow> = { key: 'company', head: head.company, cell: (row) => row.company };
  return [
    { key: 'type', head: head.type, cell: (row) => row.typeName, cardRole: 'title' },
    ...(kind === 'operator' ? [company] : []),
    {
      key: 'held',
      head: head.held[kind],
      align: 'end',
      cell: (row) => <Figure units={row.held} />,
      cardRole: 'aside',
    },
    {
      key: 'atSites',
      head: head.atSites[kind],
      align: 'end',
      cell: (row) => opened(row, 'atSites', row.atSites),
    },
    { key: 'sent', head: head.sent, align: 'end', cell: (row) => opened(row, 'sent', row.sent) },
    { key: 'toIt', head: head.toIt[kind], align: 'end', cell: (row) => opened(row, 'toIt', row.toIt) },
    {
      key: 'inQuestion',
      head: head.inQuestion,
      align: 'end',
      cell: (row) => opened(row, row.sentDiffers === 0 ? 'toItDiffers' : 'sentDiffers', row.inQuestion),
    },
  ];
}
