import type { Today } from '@/shared/contracts/today';
import { text } from '@/shared/text/catalogue';
import { formatDay, formatMoney, formatMonth } from '@/shared/text/format';
import { isZero } from '@/shared/domain/money';
import { type WorkRow, WorkCard } from './WorkCard';

const words = text.today;

/** Finance: what to close, what to issue, what is in dispute. */
export function MonthEndCard({ today }: { today: Today }) {
  const { months } = today;
  if (!months) return null;
  const rows: WorkRow[] = [
    ...months.toClose.map((month, at) => ({
      key: `close ${month}`,
      title: words.toClose(formatMonth(month)),
      lines: [],
      action: {
        href: `/months/${month}`,
        label: words.close,
        name: words.closeOf(formatMonth(month)),
        button: at === 0 ? ('primary' as const) : ('secondary' as const),
      },
    })),
    ...months.drafts.map(({ month, statements }) => ({
      key: `issue ${month}`,
      title: words.drafts(statements, formatMonth(month)),
      lines: [],
      action: { href: `/months/${month}`, label: words.issue, name: words.issueOf(formatMonth(month)) },
    })),
    ...disputedRow(months.disputed),
  ];
  if (rows.length === 0) return null;
  return <WorkCard title={words.months} rows={rows} />;
}

function disputedRow({ disputes, held }: NonNullable<Today['months']>['disputed']): WorkRow[] {
  if (disputes === 0) return [];
  const money = held
    .filter(({ amount }) => !isZero(amount))
    .map(({ amount, currency }) => formatMoney(amount, currency))
    .join(', ');
  return [
    {
      key: 'disputed',
      title: words.inDispute(disputes, money),
      lines: [],
      action: { href: '/disputes', label: words.open, name: words.openOf(words.disputes) },
    },
  ];
}

/** Statements that are out: finance waits for the answer, a partner is to give it. */
export function AwaitedCard({ today }: { today: Today }) {
  const { awaited, holding } = today;
  if (!awaited || awaited.total === 0) return null;
  return (
    <WorkCard
      {...(holding ? {} : { title: words.awaited(awaited.total) })}
      all={{ total: awaited.total, href: '/statements?answer=awaited' }}
      rows={awaited.rows.map((row) => {
        const month = formatMonth(row.month);
        const until = row.objectionUntil;
        return {
          key: row.id,
          title: holding ? words.statement(month) : words.statementOf(row.company, month),
          lines: [
            [
              words.dueNow(formatMoney(row.due.amount, row.due.currency)),
              ...(until === null ? [] : [words.answerBy(formatDay(until, 'date'))]),
            ].join(' · '),
          ],
          action: {
            href: `/statements/${row.id}`,
            label: holding ? words.check : words.open,
            name: words.openOf(words.statementOf(row.company, month)),
          },
        };
      })}
    />
  );
}
