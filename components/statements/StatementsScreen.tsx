import {
  listStatements,
  statementAnswers,
  type StatementRow,
  statementStates,
} from '@/shared/contracts/statements';
import { text } from '@/shared/text/catalogue';
import { useReadPages } from '../data/use-operation';
import { usePartnerOptions } from '../data/use-partner-options';
import { useSignedIn } from '../data/use-session';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { statementColumns } from './statement-columns';

const words = text.statements.list;

/** All statements, newest month first; a partner sees its own. */
export function StatementsScreen() {
  const { company, may } = useSignedIn();
  const { kind } = company;
  const state = useListState({
    filters: kind === 'operator' ? ['month', 'partner', 'state', 'answer'] : ['month', 'answer'],
  });
  const list = useReadPages(listStatements, { query: state.query });
  const filters = useFilters();
  return (
    <Page title={text.statements.head} lead={words.lead[kind]}>
      <RecordList<StatementRow>
        label={text.statements.head}
        list={list}
        columns={statementColumns(kind)}
        rowKey={(row) => row.id}
        rowHref={(row) => `/statements/${row.id}`}
        state={state}
        filters={filters}
        searchLabel={words.search[kind]}
        empty={{
          title: words.empty,
          hint: words.emptyHint[kind],
          ...(may('close months') ? { action: <ButtonLink href="/months" label={words.toMonths} /> } : {}),
        }}
      />
    </Page>
  );
}

function useFilters() {
  const partners = usePartnerOptions();
  const month = { key: 'month', label: words.filter.month, month: true as const };
  const answer = {
    key: 'answer',
    label: words.filter.answer,
    options: statementAnswers.map((value) => ({ value, label: text.statements.page.tags[value] })),
  };
  if (partners === null) return [month, answer];
  return [
    month,
    {
      key: 'partner',
      label: words.filter.partner,
      options: partners,
    },
    {
      key: 'state',
      label: words.filter.state,
      options: statementStates.map((value) => ({ value, label: words.states[value] })),
    },
    answer,
  ];
}
