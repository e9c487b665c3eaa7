import {
  downloadShipments,
  listShipmentChoices,
  listShipments,
  type ShipmentRow,
} from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { urlOf } from '../data/url-of';
import { useRead, useReadPages } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { optionsOf } from '../tables/filter-options';
import { RecordList } from '../tables/RecordList';
import type { Filter } from '../tables/ListTools';
import { useListState } from '../tables/use-list-state';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { shipmentColumns } from './shipment-columns';

const words = text.shipments;

const usualFilters: readonly Filter[] = [
  { key: 'direction', label: words.filter.direction, options: optionsOf(words.direction) },
  { key: 'state', label: words.filter.state, options: optionsOf(words.state) },
  { key: 'contents', label: words.filter.contents, options: optionsOf(words.contents) },
];

/** For the operator: one of the partners that shipments can go to. */
function usePartnerFilter(isOperator: boolean): Filter[] {
  const choices = useRead(listShipmentChoices, { enabled: isOperator });
  const partners = new Map(choices.data?.to.map((site) => [site.companyId, site.company]));
  if (!isOperator || partners.size === 0) return [];
  return [
    {
      key: 'partner',
      label: words.filter.partner,
      options: [...partners].map(([value, label]) => ({ value, label })),
    },
  ];
}

export function ShipmentsScreen() {
  const { may, company } = useSignedIn();
  const state = useListState({ filters: ['direction', 'state', 'contents', 'partner'] });
  const list = useReadPages(listShipments, { query: state.query as never });
  const filters = [...usualFilters, ...usePartnerFilter(company.kind === 'operator')];
  const sends = company.kind === 'operator' ? 'empties' : 'fulls';
  const send = may('send shipments') ? (
    <ButtonLink href="/shipments/send" label={words.send[sends]} />
  ) : undefined;
  return (
    <Page title={words.head} action={send}>
      <RecordList<ShipmentRow>
        label={words.head}
        list={list}
        columns={shipmentColumns}
        rowKey={(row) => row.id}
        rowHref={(row) => `/shipments/${row.id}`}
        state={state}
        filters={filters}
        searchLabel={words.search}
        downloads={[{ href: urlOf(downloadShipments, { query: state.query }), label: text.ui.download }]}
        empty={{ title: words.empty, hint: words.emptyHint[sends] }}
      />
    </Page>
  );
}
