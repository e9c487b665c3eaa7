import type { StatementRow } from '@/shared/contracts/statements';
import { text } from '@/shared/text/catalogue';
import type { Tone } from '../theme/meaning';
import { Tag } from '../ui/Tag';

const words = text.statements.page.tags;

const tones: Record<StatementRow['answer'], Tone> = {
  awaited: 'moving',
  confirmed: 'done',
  'confirmed by silence': 'done',
  disputed: 'disputed',
};

/** How a statement stands: a draft, or what the partner has answered. */
export function StatementTag({ row }: { row: Pick<StatementRow, 'state' | 'answer'> }) {
  if (row.state === 'draft') return <Tag tone="open" label={words.draft} />;
  return <Tag tone={tones[row.answer]} label={words[row.answer]} />;
}
