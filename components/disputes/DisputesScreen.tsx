import { type DisputeRow, listDisputes, subjects } from '@/shared/contracts/disputes';
import { text } from '@/shared/text/catalogue';
import { useReadPages } from '../data/use-operation';
import { usePartnerOptions } from '../data/use-partner-options';
import { useSignedIn } from '../data/use-session';
import { ListAndDetail, useSideBySide } from '../tables/ListAndDetail';
import { optionsOf } from '../tables/filter-options';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { disputeColumns } from './dispute-columns';
import { DisputePage } from './DisputePage';
import { DisputePanel } from './DisputePanel';

const words = text.disputes.list;

/** The list; from 1200 px with the thread of the chosen one beside it, below that the thread alone. */
export function DisputesScreen({ chosen }: { chosen?: string }) {
  const sideBySide = useSideBySide();
  if (chosen !== undefined && !sideBySide) return <DisputePage id={chosen} />;
  return (
    <Page title={words.head}>
      {chosen === undefined ? (
        <DisputesList />
      ) : (
        <ListAndDetail
          list={<DisputesList chosen={chosen} />}
          detail={<DisputePanel key={chosen} id={chosen} />}
        />
      )}
    </Page>
  );
}

const stateWords = {
  open: words.filter.open,
  'waiting for partner': words.filter.waiting,
  decided: words.filter.decided,
};

const usualFilters = [
  {
    key: 'state',
    label: words.filter.state,
    usual: words.filter.undecided,
    options: optionsOf(stateWords),
  },
  {
    key: 'subject',
    label: words.filter.subject,
    options: subjects.map((value) => ({
      value,
      label: value === 'count' ? words.filter.count : words.filter.line,
    })),
  },
];

/** The operator can narrow the list to one partner. */
function useFilters() {
  const options = usePartnerOptions();
  if (options === null) return usualFilters;
  return [...usualFilters, { key: 'partner', label: words.filter.partner, options }];
}

function DisputesList({ chosen }: { chosen?: string }) {
  const state = useListState({ filters: ['state', 'subject', 'partner'] });
  const list = useReadPages(listDisputes, { query: state.query });
  const isOperator = useSignedIn().company.kind === 'operator';
  const filters = useFilters();
  const asked = new URLSearchParams(state.query).toString();
  const empty = isOperator
    ? { title: words.emptyOperator, hint: words.emptyOperatorBody }
    : {
        title: words.emptyPartner,
        hint: words.emptyPartnerBody,
        action: <ButtonLink href="/shipments" label={words.toShipments} kind="secondary" />,
      };
  return (
    <RecordList<DisputeRow>
      label={words.head}
      list={list}
      columns={disputeColumns({ isOperator, chosen })}
      rowKey={(row) => row.id}
      rowHref={(row) => `/disputes/${row.id}${asked === '' ? '' : `?${asked}`}`}
      state={state}
      filters={filters}
      searchLabel={words.search}
      empty={empty}
    />
  );
}
