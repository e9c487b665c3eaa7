import type { Today } from '@/shared/contracts/today';
import { text } from '@/shared/text/catalogue';
import { formatInstant, formatMoney } from '@/shared/text/format';
import { isZero } from '@/shared/domain/money';
import { WorkCard } from './WorkCard';

const words = text.today;

/** Disputes that wait for this side's word. */
export function DisputesCard({ today }: { today: Today }) {
  const { disputes, timeZone, holding } = today;
  if (!disputes || disputes.total === 0) return null;
  return (
    <WorkCard
      title={words.disputes}
      all={{ total: disputes.total, href: '/disputes' }}
      rows={disputes.rows.map((row) => {
        const what = [row.reference, row.typeName].filter(Boolean).join(' · ');
        const title = holding || what === '' ? what || row.company : row.company;
        return {
          key: row.id,
          title,
          ...(title === row.company && what !== '' ? { beside: what } : {}),
          lines: [
            words.disputed(row.claimed, row.stated),
            [
              words.lastWord(formatInstant(row.lastWordAt, timeZone)),
              ...(isZero(row.held.amount)
                ? []
                : [words.held(formatMoney(row.held.amount, row.held.currency))]),
            ].join(' · '),
          ],
          action: { href: `/disputes/${row.id}`, label: words.answer, name: words.answerOf(title) },
        };
      })}
    />
  );
}
