import { listPeople, type PersonRow } from '@/shared/contracts/people';
import { listPartners } from '@/shared/contracts/partners';
import { text } from '@/shared/text/catalogue';
import { formatInstant } from '@/shared/text/format';
import { useRead, useReadPages } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import type { Column } from '../tables/column';
import { optionsOf } from '../tables/filter-options';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { CellText } from '../ui/CellText';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { Tag } from '../ui/Tag';

const words = text.people;
const tones = { active: 'done', invited: 'moving', disabled: 'open' } as const;

const columnsFor = (zone: string): readonly Column<PersonRow>[] => [
  {
    key: 'name',
    head: words.columns.name,
    cell: (row) => <CellText strong>{row.name}</CellText>,
    cardRole: 'title',
  },
  { key: 'email', head: words.columns.email, cell: (row) => <CellText>{row.email}</CellText> },
  { key: 'company', head: words.columns.company, cell: (row) => <CellText>{row.company.name}</CellText> },
  {
    key: 'roles',
    head: words.columns.roles,
    cell: (row) => <CellText>{row.roles.map((role) => words.roles[role].label).join(', ')}</CellText>,
  },
  {
    key: 'last',
    head: words.columns.last,
    cell: (row) => (
      <CellText>{row.lastSignedInAt ? formatInstant(row.lastSignedInAt, zone) : words.never}</CellText>
    ),
  },
  {
    key: 'state',
    head: words.columns.state,
    cardRole: 'tag',
    cell: (row) => <Tag tone={tones[row.state]} label={words.states[row.state]} />,
  },
];

const stateFilter = {
  key: 'state',
  label: words.stateFilter,
  usual: words.anyState,
  options: optionsOf(words.states),
};

/** The operator can narrow the list to one company; a partner sees its own people only. */
function useFilters() {
  const isOperator = useSignedIn().company.kind === 'operator';
  const companies = useRead(listPartners, { query: { limit: 200 }, enabled: isOperator }).data?.rows ?? [];
  if (!isOperator) return [stateFilter];
  return [
    stateFilter,
    {
      key: 'company',
      label: words.companyFilter,
      options: companies.map(({ id, name }) => ({ value: id, label: name })),
    },
  ];
}

export function PeopleScreen() {
  const state = useListState({ filters: ['state', 'company'] });
  const list = useReadPages(listPeople, { query: state.query });
  const filters = useFilters();
  const { company, may } = useSignedIn();
  const invite = may('invite people') ? <ButtonLink href="/people/invite" label={words.invite} /> : undefined;
  return (
    <Page title={words.title} action={invite}>
      <RecordList<PersonRow>
        label={words.title}
        list={list}
        columns={columnsFor(company.timeZone)}
        rowKey={(row) => row.id}
        {...(may('invite people') ? { rowHref: (row: PersonRow) => `/people/${row.id}` } : {})}
        state={state}
        filters={filters}
        searchLabel={words.search}
        empty={{ ...words.empty, action: invite }}
      />
    </Page>
  );
}
