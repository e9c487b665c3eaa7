import { listTerms } from '@/shared/contracts/terms';
import type { AnswerOf } from '@/shared/contracts/operation';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import { useReadPages } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import type { Column } from '../tables/column';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { CellText } from '../ui/CellText';
import { Figure } from '../ui/Figure';
import { Page } from '../ui/Page';
import { Tag } from '../ui/Tag';
import { PartnerTermsScreen } from './PartnerTermsScreen';

const words = text.terms;
type Row = AnswerOf<typeof listTerms>['rows'][number];

/** Partners with their terms; a partner comes straight to its own. */
export function TermsScreen() {
  const { company } = useSignedIn();
  return company.kind === 'partner' ? <PartnerTermsScreen partner={company.id} /> : <Partners />;
}

function Partners() {
  const state = useListState({});
  const list = useReadPages(listTerms, { query: state.query });
  return (
    <Page title={words.head} lead={words.lead}>
      <RecordList<Row>
        label={words.head}
        list={list}
        columns={columns}
        rowKey={(row) => row.partner.id}
        rowHref={(row) => `/terms/${row.partner.id}`}
        state={state}
        searchLabel={words.search}
        empty={{ title: words.empty, hint: words.emptyHint }}
      />
    </Page>
  );
}

const columns: Column<Row>[] = [
  {
    key: 'partner',
    head: words.partner,
    cardRole: 'title',
    cell: (row) => <CellText strong>{row.partner.name}</CellText>,
  },
  {
    key: 'state',
    head: words.field.typeCode,
    cardRole: 'tag',
    cell: ({ typesWithout }) =>
      typesWithout.length > 0 ? (
        <Tag tone="differs" label={words.without(typesWithout)} />
      ) : (
        <Tag tone="done" label={words.complete} />
      ),
  },
  {
    key: 'types',
    head: words.types,
    align: 'end',
    cell: (row) => <Figure units={row.typesInForce} plain />,
  },
  { key: 'currency', head: words.currency, cell: (row) => row.settings.currency },
  { key: 'tax', head: words.tax, align: 'end', cell: (row) => words.taxAt(row.settings.taxRate) },
  {
    key: 'next',
    head: words.nextChange,
    cell: (row) => (row.nextChange ? formatDay(row.nextChange) : '–'),
  },
];
