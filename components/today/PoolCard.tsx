import type { MoneyOf, PoolOfType, Today } from '@/shared/contracts/today';
import { add } from '@/shared/domain/money';
import { text } from '@/shared/text/catalogue';
import { formatMoney } from '@/shared/text/format';
import { useSignedIn } from '../data/use-session';
import { Card } from '../ui/Card';
import { Circuit } from '../ui/Circuit';

const words = text.today;

type Props = { pool: NonNullable<Today['pool']>; type: string; title?: string };

/** The pool as one loop; each stretch opens what is in it. */
export function PoolCard({ pool, type, title }: Props) {
  const { may } = useSignedIn();
  const types = type === '' ? pool.types : pool.types.filter((each) => each.typeCode === type);
  const sum = (part: 'fulls' | 'empties' | 'partners' | 'plants' | 'inQuestion' | 'total') =>
    types.reduce((units, each) => units + each[part], 0);
  const money = sumOfMoney(types.flatMap((each) => each.atStake))
    .map(({ amount, currency }) => formatMoney(amount, currency))
    .join(', ');
  const onTheWay = '/shipments?state=on%20the%20way&contents=';
  const atBalances = type === '' ? '/balances' : `/balances?type=${type}`;
  return (
    <Card {...(title === undefined ? {} : { title })}>
      <Circuit
        label={words.poolHead}
        partners={{
          units: sum('partners'),
          words: words.partners.words(pool.partners),
          key: words.partners.key,
          href: atBalances,
        }}
        full={{ units: sum('fulls'), ...words.full, href: `${onTheWay}fulls` }}
        plants={{ units: sum('plants'), ...words.plants, href: atBalances }}
        empty={{ units: sum('empties'), ...words.empty, href: `${onTheWay}empties` }}
        inQuestion={{
          units: sum('inQuestion'),
          words: words.inQuestion.words(money),
          key: words.inQuestion.key,
          href: may('see differences') ? '/differences' : '/shipments?state=differs',
        }}
        note={noteOf(types, sum('total'))}
      />
    </Card>
  );
}

function noteOf(types: readonly PoolOfType[], total: number): string {
  const sized = types.filter((each) => each.approved !== null);
  const approved = sized.reduce((units, each) => units + (each.approved ?? 0), 0);
  const under = sized.filter((each) => each.total < (each.approved ?? 0)).length;
  const isWhole = sized.length === types.length;
  return [
    words.inPool(total),
    ...(isWhole && sized.length > 0 ? [words.approved(approved)] : []),
    ...(sized.length > 0 ? [words.under(under, sized.length)] : []),
  ].join(' · ');
}

/** One amount per currency: amounts of different currencies are never added. */
export function sumOfMoney(amounts: readonly MoneyOf[]): MoneyOf[] {
  const sums = new Map<string, string>();
  for (const { currency, amount } of amounts) sums.set(currency, add(sums.get(currency) ?? '0', amount));
  return [...sums].map(([currency, amount]) => ({ currency, amount }));
}
