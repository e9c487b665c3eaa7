import {
  type ContainerTypeRow,
  downloadContainerTypes,
  listContainerTypes,
  typeKinds,
} from '@/shared/contracts/container-types';
import { text } from '@/shared/text/catalogue';
import { urlOf } from '../data/url-of';
import { useReadPages } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { typeColumns } from './type-columns';

const words = text.containerTypes;

const filters = [
  {
    key: 'kind',
    label: words.filter.kind,
    options: typeKinds.map((kind) => ({ value: kind, label: words.kinds[kind] })),
  },
  {
    key: 'use',
    label: words.filter.use,
    options: (['in use', 'out of use'] as const).map((use) => ({ value: use, label: words.use[use] })),
  },
];

export function ContainerTypesScreen() {
  const state = useListState({ filters: ['kind', 'use'], sort: 'name' });
  const list = useReadPages(listContainerTypes, { query: state.query });
  const { may } = useSignedIn();
  const add = may('keep container types') ? (
    <ButtonLink href="/container-types/new" label={words.add} />
  ) : undefined;
  return (
    <Page title={words.title} action={add}>
      <RecordList<ContainerTypeRow>
        label={words.title}
        list={list}
        columns={typeColumns}
        rowKey={(row) => row.code}
        rowHref={(row) => `/container-types/${row.code}`}
        state={state}
        filters={filters}
        searchLabel={words.search}
        downloads={[{ href: urlOf(downloadContainerTypes, { query: state.query }), label: text.ui.download }]}
        empty={{ ...words.empty, action: add }}
      />
    </Page>
  );
}
