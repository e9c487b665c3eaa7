import { downloadPool, listPool, type PoolRow } from '@/shared/contracts/pool';
import { text } from '@/shared/text/catalogue';
import { urlOf } from '../data/url-of';
import { useReadPages } from '../data/use-operation';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { poolColumns } from './pool-columns';

const words = text.pool;

export function PoolListScreen() {
  const state = useListState({ sort: 'type' });
  const list = useReadPages(listPool, { query: state.query });
  return (
    <Page title={words.title} lead={words.lead}>
      <RecordList<PoolRow>
        label={words.title}
        list={list}
        columns={poolColumns}
        rowKey={(row) => row.type.code}
        rowHref={(row) => `/pool/${row.type.code}`}
        state={state}
        searchLabel={words.search}
        downloads={[{ href: urlOf(downloadPool, { query: state.query }), label: text.ui.download }]}
        empty={{
          title: words.empty.title,
          hint: words.empty.hint,
          action: <ButtonLink href="/container-types" label={words.empty.action} />,
        }}
      />
    </Page>
  );
}
