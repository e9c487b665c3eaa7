import type { Today } from '@/shared/contracts/today';
import { text } from '@/shared/text/catalogue';
import { WorkCard } from './WorkCard';

const words = text.today;
type Level = NonNullable<Today['levels']>[number];

const offBy = ({ there, minimum, maximum }: Level) =>
  there < minimum ? words.underBy(minimum - there) : words.over(there - maximum);

/** Types and sites that are under or over what the engineer approved. */
export function LevelsCard({ today }: { today: Today }) {
  const levels = today.levels ?? [];
  if (levels.length === 0) return null;
  return (
    <WorkCard
      title={words.levels}
      rows={levels.map((level) => ({
        key: `${level.typeCode} ${level.site ?? ''}`,
        title: level.typeName,
        beside: level.site ?? words.wholePool,
        tag: { tone: level.there < level.minimum ? 'differs' : 'moving', label: offBy(level) },
        lines: [words.there(level.there, level.minimum, level.maximum)],
        action: {
          href: `/pool/${level.typeCode}`,
          label: words.openPool,
          name: words.openOf(level.typeName),
        },
      }))}
    />
  );
}
