import type { ShipmentRow } from '@/shared/contracts/shipments';
import type { Today } from '@/shared/contracts/today';
import { daysBetween } from '@/shared/domain/calendar';
import { text } from '@/shared/text/catalogue';
import { formatDay, formatUnits } from '@/shared/text/format';
import { type WorkRow, WorkCard } from './WorkCard';

const words = text.today;

export function loadWords(row: Pick<ShipmentRow, 'lines'>): string {
  return row.lines.map((line) => `${formatUnits(line.declared)} ${line.typeName}`).join(' · ');
}

/** What is on its way to the own sites; the first is the one to count next. */
export function DeliveriesCard({ today }: { today: Today }) {
  const { toCount, day } = today;
  if (!toCount || toCount.total === 0) return null;
  const title = today.holding ? words.deliveries : words.fulls;
  return (
    <WorkCard
      title={title(toCount.total)}
      tag={{ tone: 'moving', label: words.onTheWay }}
      all={{ total: toCount.total, href: '/shipments?direction=in&state=on%20the%20way' }}
      rows={toCount.rows.map((row, at) => countRow(row, { day, isFirst: at === 0 }))}
    />
  );
}

function countRow(row: ShipmentRow, { day, isFirst }: { day: string; isFirst: boolean }): WorkRow {
  return {
    key: row.id,
    title: row.reference,
    beside: words.fromSite(row.from.site),
    lines: [loadWords(row), words.due(daysBetween(day, row.expectedOn), formatDay(row.expectedOn, 'date'))],
    action: {
      href: `/shipments/${row.id}/count`,
      label: words.count,
      name: words.countOf(row.reference),
      button: isFirst ? 'primary' : 'secondary',
    },
  };
}

/** What should have been counted long ago. */
export function OverdueCard({ today }: { today: Today }) {
  const { overdue, day } = today;
  if (!overdue || overdue.total === 0) return null;
  return (
    <WorkCard
      title={words.overdue}
      all={{ total: overdue.total, href: '/shipments?state=overdue&sort=expectedOn' }}
      rows={overdue.rows.map((row) => ({
        key: row.id,
        title: row.reference,
        beside: words.between(row.from.site, row.to.site),
        lines: [loadWords(row), words.overdueFor(daysBetween(row.expectedOn, day))],
        action: {
          href: `/shipments/${row.id}`,
          label: words.open,
          name: words.openOf(row.reference),
        },
      }))}
    />
  );
}
