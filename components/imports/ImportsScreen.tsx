import { importStates, listImports, type ImportRow } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import { useReadPages } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { importColumns } from './import-columns';

const words = text.imports;

const filters = [
  {
    key: 'state',
    label: words.list.state,
    options: importStates.map((value) => ({ value, label: words.states[value] })),
  },
];

export function ImportsScreen() {
  const state = useListState({ filters: ['state'] });
  const list = useReadPages(listImports, { query: state.query });
  const { company } = useSignedIn();
  const begin = <ButtonLink href="/imports/new" label={words.list.newOne} />;
  return (
    <Page title={words.list.head} lead={words.list.lead} action={begin}>
      <RecordList<ImportRow>
        label={words.list.head}
        list={list}
        columns={importColumns(company.timeZone)}
        rowKey={(row) => row.id}
        rowHref={(row) => `/imports/${row.id}`}
        state={state}
        filters={filters}
        empty={words.list.empty}
      />
    </Page>
  );
}
