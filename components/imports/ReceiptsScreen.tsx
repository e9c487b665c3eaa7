import {
  bookUnannounced,
  listImportReceipts,
  receiptStates,
  type ImportReceipt,
} from '@/shared/contracts/import-results';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { usePost, useReadPages } from '../data/use-operation';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { Button } from '../ui/Button';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Text } from '../ui/Text';
import { receiptColumns } from './receipt-columns';
import { useChosen } from './use-chosen';

const words = text.imports.receipts;
type Booked = { booked: number; skipped: { id: string }[] };

/** Receipts of a file that no shipment was counted by, in one state; unannounced ones can be booked. */
export function ReceiptsScreen({ id }: { id: string }) {
  const { query } = useListState({ filters: ['state'] });
  const state = receiptStates.find((known) => known === query.state) ?? 'unannounced';
  const list = useReadPages(listImportReceipts, { params: { import: id }, query: { state } });
  const chosen = useChosen();
  const book = usePost(bookUnannounced, { refreshes: ['shipments', 'differences', 'balances'] });
  const count = chosen.ids.length;
  const isEmpty = list.data?.pages.every((page) => page.rows.length === 0) ?? true;
  const action =
    state === 'unannounced' && !isEmpty ? (
      <Button
        label={words.book(count)}
        disabled={count === 0}
        busy={book.isPending}
        onPress={() => book.mutate({ body: { receipts: [...chosen.ids] } }, { onSuccess: chosen.clear })}
      />
    ) : undefined;
  return (
    <Page
      title={words.heads[state]}
      lead={words.leads[state]}
      back={{ href: `/imports/${id}`, label: text.imports.oneHead }}
      {...(action ? { action } : {})}
    >
      {book.error ? <Problem error={book.error} /> : null}
      {book.data ? <Outcome outcome={book.data as Booked} /> : null}
      <RecordList<ImportReceipt>
        label={words.heads[state]}
        list={list}
        columns={receiptColumns(state, chosen)}
        rowKey={(row) => row.id}
        empty={words.empty}
      />
    </Page>
  );
}

function Outcome({ outcome }: { outcome: Booked }) {
  return (
    <Notice kind={outcome.skipped.length > 0 ? 'caution' : 'success'}>
      <Text>{words.booked(outcome.booked)}</Text>
      {outcome.skipped.length > 0 ? (
        <Text>{text.imports.suggestions.skipped(outcome.skipped.length)}</Text>
      ) : null}
    </Notice>
  );
}
