import type { Today } from '@/shared/contracts/today';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import { type WorkRow, WorkCard } from './WorkCard';

const words = text.today;

/** The administrator: who has not come in, which letters failed, whether the book adds up. */
export function AdministrationCard({ today }: { today: Today }) {
  const { administration } = today;
  if (!administration) return null;
  const rows: WorkRow[] = [
    ...(administration.bookDiffers
      ? [
          {
            key: 'book',
            tag: { tone: 'differs' as const, label: words.bookDiffers },
            lines: [words.bookDiffersHint],
            action: { href: '/log?subject=book', label: words.open, name: words.openOf(words.bookDiffers) },
          },
        ]
      : []),
    ...(administration.failedLetters > 0
      ? [
          {
            key: 'letters',
            title: words.failed(administration.failedLetters),
            lines: [],
            action: {
              href: '/mail?state=failed',
              label: words.open,
              name: words.openOf(words.failed(administration.failedLetters)),
            },
          },
        ]
      : []),
    ...administration.invited.map((person) => ({
      key: person.id,
      title: words.invited(person.name, person.company),
      lines: [words.invitedSince(formatDay(person.since.slice(0, 10), 'date'))],
      action: { href: `/people/${person.id}`, label: words.open, name: words.openOf(person.name) },
    })),
  ];
  if (rows.length === 0) return null;
  return <WorkCard title={words.administration} rows={rows} />;
}
