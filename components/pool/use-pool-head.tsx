import { dayInZone } from '@/shared/domain/calendar';
import { text } from '@/shared/text/catalogue';
import { useSignedIn } from '../data/use-session';
import { Tag } from '../ui/Tag';
import { manyOf, type Pool } from './pool-answer';

const words = text.pool;
const back = { href: '/pool', label: words.title };

/** What every page of a type's pool has at its head. */
export function usePoolHead(pool: Pool) {
  const { company } = useSignedIn();
  const { approved } = pool;
  return {
    title: words.question(manyOf(pool)),
    kicker: pool.type.name,
    back,
    beside: approved ? (
      <Tag tone="done" label={words.approvedTag(approved.size, dayInZone(approved.at, company.timeZone))} />
    ) : undefined,
  };
}
