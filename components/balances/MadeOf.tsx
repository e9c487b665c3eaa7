import type { BalancePart, readBalance } from '@/shared/contracts/balances';
import type { AnswerOf } from '@/shared/contracts/operation';
import { text } from '@/shared/text/catalogue';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Sheet, type SheetColumn } from '../ui/Sheet';
import { Text } from '../ui/Text';
import { balanceHref } from './balance-href';

const words = text.balances;

type Balance = AnswerOf<typeof readBalance>;
type Row = { key: string; label: string; units: number; part?: BalancePart };
type Props = { balance: Balance; part: BalancePart };

/** The ruled sheet of a balance: what the company answers for adds up, what is not yet its own stands below. */
export function MadeOf({ balance, part }: Props) {
  const own: Row[] = [
    { key: 'atSites', label: words.part.atSites, units: balance.atSites, part: 'atSites' },
    ...(balance.sites.length > 1
      ? balance.sites.map(({ siteId, site, units }) => ({ key: siteId, label: `– ${site}`, units }))
      : []),
    { key: 'sent', label: words.part.sent, units: balance.sent, part: 'sent' },
    { key: 'sentDiffers', label: words.part.sentDiffers, units: balance.sentDiffers, part: 'sentDiffers' },
  ];
  const others: Row[] = [
    { key: 'toIt', label: words.part.toIt, units: balance.toIt, part: 'toIt' },
    { key: 'toItDiffers', label: words.part.toItDiffers, units: balance.toItDiffers, part: 'toItDiffers' },
  ];
  const columns = columnsFor(part, balance);
  return (
    <Card title={words.partsHead}>
      <Sheet
        caption={words.held}
        hideCaption
        columns={columns}
        rows={own}
        rowKey={(row) => row.key}
        sum={{ where: words.held, units: <Figure units={balance.held} /> }}
      />
      <Text variant="small">{words.heldNote}</Text>
      <Sheet caption={words.notHeld} columns={columns} rows={others} rowKey={(row) => row.key} />
    </Card>
  );
}

function columnsFor(chosen: BalancePart, balance: Balance): readonly SheetColumn<Row>[] {
  return [
    {
      key: 'where',
      head: words.where,
      cell: ({ label, part }) =>
        part ? (
          <Link
            href={balanceHref(balance, { part, asOf: balance.asOf ?? undefined })}
            label={part === chosen ? `${label} ✓` : label}
            name={words.movementsHead(label)}
            strong={part === chosen}
          />
        ) : (
          <Text variant="soft">{label}</Text>
        ),
    },
    { key: 'units', head: words.units, align: 'end', cell: ({ units }) => <Figure units={units} plain /> },
  ];
}
