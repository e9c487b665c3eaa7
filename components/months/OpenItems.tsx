import type { OpenItem } from '@/shared/contracts/months';
import { text } from '@/shared/text/catalogue';
import { Card } from '../ui/Card';
import { Figure } from '../ui/Figure';
import { Link } from '../ui/Link';
import { Sheet } from '../ui/Sheet';
import { Text } from '../ui/Text';
import type { MonthPage } from './MonthScreen';

const words = text.months;

/** Where each thing is settled. */
function hrefOf({ kind, partner, typeCode }: OpenItem): string {
  if (kind === 'terms missing') return `/terms/${partner.id}/set?type=${encodeURIComponent(typeCode ?? '')}`;
  if (kind === 'uncounted') return `/shipments?partner=${partner.id}&state=overdue`;
  return `/${kind}?partner=${partner.id}`;
}

export function OpenItems({ page }: { page: MonthPage }) {
  const { openItems } = page;
  return (
    <Card title={words.openHead}>
      {openItems.length === 0 ? (
        <Text variant="soft">{words.nothingOpen}</Text>
      ) : (
        <>
          {page.state === 'open' ? <Text variant="soft">{words.openLead}</Text> : null}
          <Sheet<OpenItem>
            caption={words.openHead}
            hideCaption
            rows={openItems}
            rowKey={(item) => `${item.kind} ${item.partner.id} ${item.typeCode}`}
            columns={[
              { key: 'what', head: words.itemHeads.what, cell: (item) => <Item item={item} /> },
              {
                key: 'partner',
                head: words.itemHeads.partner,
                cell: (item) => <Text>{item.partner.name}</Text>,
              },
              {
                key: 'money',
                head: words.itemHeads.money,
                align: 'end',
                cell: ({ money }) =>
                  money ? <Figure money={money.amount} currency={money.currency} /> : <Text>–</Text>,
              },
            ]}
            stack
          />
        </>
      )}
    </Card>
  );
}

function Item({ item }: { item: OpenItem }) {
  const label = words.item[item.kind](item.count, item.typeCode);
  return <Link href={hrefOf(item)} label={label} name={`${label}, ${item.partner.name}`} />;
}
