import {
  differenceKinds,
  listDifferenceChoices,
  listDifferences,
  type DifferenceRow,
} from '@/shared/contracts/differences';
import { text } from '@/shared/text/catalogue';
import { useRead, useReadPages } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { ListAndDetail, useSideBySide } from '../tables/ListAndDetail';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { Page } from '../ui/Page';
import { differenceColumns, hrefOf } from './difference-columns';
import { DifferencePage } from './DifferencePage';
import { DifferencePanel } from './DifferencePanel';

const words = text.differences;

/** The list; from 1200 px with the chosen one beside it, below that the chosen one alone. */
export function DifferencesScreen({ chosen }: { chosen?: string }) {
  const sideBySide = useSideBySide();
  if (chosen !== undefined && !sideBySide) return <DifferencePage id={chosen} />;
  return (
    <Page title={words.head} lead={words.lead}>
      {chosen === undefined ? (
        <DifferencesList />
      ) : (
        <ListAndDetail
          list={<DifferencesList chosen={chosen} />}
          detail={<DifferencePanel key={chosen} id={chosen} />}
        />
      )}
    </Page>
  );
}

function DifferencesList({ chosen }: { chosen?: string }) {
  const state = useListState({ filters: ['kind', 'partner', 'type', 'state'] });
  const list = useReadPages(listDifferences, { query: state.query });
  const filters = useFilters();
  const { may } = useSignedIn();
  const show = { settles: may('settle differences'), answers: may('answer disputes'), chosen };
  return (
    <RecordList<DifferenceRow>
      label={words.head}
      list={list}
      columns={differenceColumns(show)}
      rowKey={(row) => row.id}
      rowHref={(row) => hrefOf(row, { query: state.query, ...show })}
      state={state}
      filters={filters}
      searchLabel={words.search}
      empty={{ title: words.empty, hint: words.emptyBody }}
    />
  );
}

function useFilters() {
  const choices = useRead(listDifferenceChoices).data;
  return [
    {
      key: 'kind',
      label: words.filter.kind,
      options: differenceKinds.map((value) => ({ value, label: words.kinds[value] })),
    },
    {
      key: 'partner',
      label: words.filter.partner,
      options: (choices?.partners ?? []).map(({ id, name }) => ({ value: id, label: name })),
    },
    {
      key: 'type',
      label: words.filter.type,
      options: (choices?.types ?? []).map(({ code, name }) => ({ value: code, label: name })),
    },
    {
      key: 'state',
      label: words.filter.state,
      usual: words.filter.open,
      options: [{ value: 'settled', label: words.filter.settled }],
    },
  ];
}
