import type { MonthRow } from '@/shared/contracts/months';
import { text } from '@/shared/text/catalogue';
import { Tag } from '../ui/Tag';

const words = text.months.states;

export function MonthTag({ row }: { row: Pick<MonthRow, 'state' | 'over'> }) {
  if (row.state === 'closed') return <Tag tone="done" label={words.closed} />;
  return row.over ? <Tag tone="open" label={words.open} /> : <Tag tone="moving" label={words.running} />;
}
