import { add, multiply } from '@/shared/domain/money';
import { text } from '@/shared/text/catalogue';
import { formatAmount, formatDay, formatMoney, formatUnits } from '@/shared/text/format';
import { Card } from '../ui/Card';
import { Disclosure } from '../ui/Disclosure';
import { Link } from '../ui/Link';
import { Sheet, type SheetColumn } from '../ui/Sheet';
import { Tag } from '../ui/Tag';
import { Text } from '../ui/Text';
import type { PartnerTermsPage } from './PartnerTermsScreen';

const words = text.terms;
type TypeTerms = PartnerTermsPage['types'][number];
type Version = TypeTerms['versions'][number];
const tone = { 'in force': 'done', ahead: 'moving', earlier: 'open' } as const;

/** The terms of one type: what is in force and ahead, with earlier versions a press away. */
export function TypeTermsCard({ page, terms }: { page: PartnerTermsPage; terms: TypeTerms }) {
  const { type, versions } = terms;
  const { currency } = page.settings;
  const now = versions.filter((version) => version.standing !== 'earlier');
  const before = versions.filter((version) => version.standing === 'earlier');
  const inForce = versions.find((version) => version.standing === 'in force');
  const sheet = (rows: readonly Version[]) => (
    <Sheet<Version>
      caption={type.name}
      hideCaption
      columns={columnsIn(currency)}
      rows={rows}
      rowKey={(row) => row.id}
      stack
    />
  );
  return (
    <Card
      title={type.name}
      {...(page.maySet
        ? {
            beside: (
              <Link
                href={`/terms/${page.partner.id}/set?type=${encodeURIComponent(type.code)}`}
                label={words.set}
                name={words.setFor(type.name)}
              />
            ),
          }
        : {})}
    >
      {sheet(now.length > 0 ? now : before)}
      {inForce ? <Worked version={inForce} currency={currency} /> : null}
      {now.length > 0 && before.length > 0 ? (
        <Disclosure label={words.earlier(before.length)}>{sheet(before)}</Disclosure>
      ) : null}
    </Card>
  );
}

function Worked({ version, currency }: { version: Version; currency: string }) {
  const { freeDays, dailyFee, replacement, residualFloorPct, deposit } = version;
  const money = (amount: string) => formatMoney(amount, currency);
  const floor = multiply(multiply(replacement, residualFloorPct), '0.01');
  const free = add(dailyFee, '0') === '0';
  return (
    <Disclosure label={words.worked}>
      <Text>
        {free
          ? words.example.noFee
          : words.example.fee(freeDays, formatAmount(dailyFee, currency), money(multiply(dailyFee, 10)))}
      </Text>
      <Text>{words.example.loss(money(floor), money(replacement), money(deposit))}</Text>
    </Disclosure>
  );
}

function columnsIn(currency: string): SheetColumn<Version>[] {
  const figures = (
    key: keyof typeof words.short,
    of: (version: Version) => string,
  ): SheetColumn<Version> => ({
    key,
    head: words.short[key],
    align: 'end',
    cell: (version) => <Text>{of(version)}</Text>,
  });
  return [
    {
      key: 'validFrom',
      head: words.short.validFrom,
      cell: ({ validFrom }) => <Text strong>{formatDay(validFrom)}</Text>,
    },
    {
      key: 'standing',
      head: words.short.standing,
      cell: ({ standing }) => <Tag tone={tone[standing]} label={words.standing[standing]} />,
    },
    figures('deposit', (version) => formatAmount(version.deposit, currency)),
    figures('replacement', (version) => formatAmount(version.replacement, currency)),
    figures('freeDays', (version) => formatUnits(version.freeDays)),
    figures('dailyFee', (version) => formatAmount(version.dailyFee, currency)),
    figures('lostAfterDays', ({ lostAfterDays }) =>
      lostAfterDays === null ? words.never : words.days(lostAfterDays),
    ),
    figures('residual', (version) => words.life(version.usefulLifeMonths, version.residualFloorPct)),
    figures('damageFee', (version) => formatAmount(version.damageFee, currency)),
    figures('cleaningFee', (version) => formatAmount(version.cleaningFee, currency)),
    figures('recoveryDays', (version) => words.days(version.recoveryDays)),
  ];
}
