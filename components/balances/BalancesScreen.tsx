import { type BalanceRow, downloadBalances, listBalances } from '@/shared/contracts/balances';
import { listShipmentChoices } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { urlOf } from '../data/url-of';
import { useRead, useReadPages } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import type { Filter } from '../tables/ListTools';
import { RecordList } from '../tables/RecordList';
import { useListState } from '../tables/use-list-state';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { balanceColumns } from './balance-columns';
import { balanceHref } from './balance-href';

const words = text.balances;

/** Who holds how many of what, now or at the end of a day. */
export function BalancesScreen() {
  const { may, company } = useSignedIn();
  const isOperator = company.kind === 'operator';
  const state = useListState({ filters: ['type', 'company', 'asOf'] });
  const list = useReadPages(listBalances, { query: state.query as never });
  const asOf = state.filters['asOf'] || undefined;
  const types = useRead(listShipmentChoices).data?.types ?? [];
  const filters: Filter[] = [
    ...(types.length === 0
      ? []
      : [
          {
            key: 'type',
            label: words.filter.type,
            options: types.map((type) => ({ value: type.code, label: type.name })),
          },
        ]),
    { key: 'asOf', label: words.filter.asOf, day: true },
  ];
  return (
    <Page
      title={words.head[company.kind]}
      lead={words.heldNote}
      action={
        may('adjust stock') ? (
          <ButtonLink kind="secondary" href="/balances/adjust" label={words.adjust} />
        ) : undefined
      }
    >
      <RecordList<BalanceRow>
        label={words.head[company.kind]}
        list={list}
        columns={balanceColumns({ kind: company.kind, asOf })}
        rowKey={(row) => `${row.companyId} ${row.typeCode}`}
        rowHref={(row) => balanceHref(row, { asOf })}
        state={state}
        filters={filters}
        downloads={[{ href: urlOf(downloadBalances, { query: state.query }), label: text.ui.download }]}
        {...(isOperator ? { searchLabel: words.search } : {})}
        empty={{ title: words.empty, hint: words.emptyHint[company.kind] }}
      />
    </Page>
  );
}
