import type { ContentLine } from '@/shared/domain/statement/content';
import { text } from '@/shared/text/catalogue';
import { Tag } from '../ui/Tag';
import type { StatementPage } from './StatementScreen';

const words = text.statements.page;

/** What of these lines is in dispute and not decided yet. */
export function DisputeTags({ page, lines }: { page: StatementPage; lines: readonly ContentLine[] }) {
  const ids = lines.map((line) => line.id);
  const open = page.disputes.filter((each) => each.undecided && each.lineId && ids.includes(each.lineId));
  return open.map(({ id, stated, claimed }) => (
    <Tag
      key={id}
      tone="disputed"
      label={stated === claimed ? words.disputed : words.disputedUnits(Math.abs(stated - claimed), stated)}
    />
  ));
}
