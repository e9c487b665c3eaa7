import type { DisputeRow } from '@/shared/contracts/disputes';
import { text } from '@/shared/text/catalogue';
import type { Column } from '../tables/column';
import type { Tone } from '../theme/meaning';
import { CellText } from '../ui/CellText';
import { Figure } from '../ui/Figure';
import { Tag } from '../ui/Tag';

const words = text.disputes.list;

function toneOf(row: DisputeRow): Tone {
  if (row.waitingFor !== null) return row.yourTurn ? 'disputed' : 'moving';
  return row.state === 'accepted' || row.state === 'accepted in part' ? 'done' : 'open';
}

export function DisputeTag({ row }: { row: DisputeRow }) {
  return <Tag tone={toneOf(row)} label={words.tag(row)} />;
}

const aboutOf = (chosen: string | undefined): Column<DisputeRow> => ({
  key: 'about',
  head: words.column.about,
  cardRole: 'title',
  cell: (row) => (
    <CellText strong>
      {row.id === chosen ? words.chosen(text.disputes.about(row)) : text.disputes.about(row)}
    </CellText>
  ),
});
const partner: Column<DisputeRow> = {
  key: 'partner',
  head: words.column.partner,
  cell: (row) => row.company,
};
const claim: Column<DisputeRow> = {
  key: 'claim',
  head: words.column.claim,
  cell: (row) => text.disputes.claim(row),
};
const held: Column<DisputeRow> = {
  key: 'held',
  head: words.column.held,
  align: 'end',
  cell: (row) => (
    <Figure money={row.subject === 'count' ? null : row.amountHeld} currency={row.currency} plain />
  ),
};
const state: Column<DisputeRow> = {
  key: 'state',
  head: words.column.state,
  cardRole: 'tag',
  cell: (row) => <DisputeTag row={row} />,
};
const next: Column<DisputeRow> = { key: 'next', head: words.column.next, cell: (row) => words.next(row) };

/** All columns; the operator's people see whose it is, and beside an open thread only what finds a row again. */
export function disputeColumns(show: {
  isOperator: boolean;
  chosen: string | undefined;
}): Column<DisputeRow>[] {
  const about = aboutOf(show.chosen);
  const whose = show.isOperator ? [partner] : [];
  return show.chosen !== undefined ? [about, ...whose, state] : [about, ...whose, claim, held, state, next];
}
