import { listPartners, type PartnerRow } from '@/shared/contracts/partners';
import { text } from '@/shared/text/catalogue';
import { useReadPages } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { partnerColumns } from './partner-columns';

const words = text.partners;

export function PartnersScreen() {
  const state = useListState();
  const list = useReadPages(listPartners, { query: { kind: 'partner', ...state.query } });
  const { may } = useSignedIn();
  const add = may('keep partners') ? <ButtonLink href="/partners/new" label={words.add} /> : undefined;
  return (
    <Page title={words.title} action={add}>
      <RecordList<PartnerRow>
        label={words.title}
        list={list}
        columns={partnerColumns}
        rowKey={(row) => row.id}
        rowHref={(row) => `/partners/${row.id}`}
        state={state}
        searchLabel={words.search}
        empty={{ ...words.empty, action: add }}
      />
    </Page>
  );
}
