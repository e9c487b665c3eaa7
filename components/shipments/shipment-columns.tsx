import type { ShipmentRow } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import { formatDay } from '@/shared/text/format';
import type { Column } from '../tables/column';
import { Tag } from '../ui/Tag';
import { loadOf } from './load-words';
import { stateOf } from './shipment-state';

const head = text.shipments.column;

/** Shipments as a table or as cards. */
export const shipmentColumns: Column<ShipmentRow>[] = [
  { key: 'reference', head: head.reference, cell: (row) => row.reference, cardRole: 'title', whole: true },
  {
    key: 'contents',
    head: head.contents,
    cell: (row) => text.shipments.contents[row.contents],
    cardRole: 'aside',
  },
  { key: 'from', head: head.from, cell: (row) => row.from.site },
  { key: 'to', head: head.to, cell: (row) => row.to.site },
  { key: 'load', head: head.load, cell: loadOf },
  {
    key: 'leftOn',
    head: head.leftOn,
    cell: (row) => formatDay(row.leftOn, 'short'),
    width: 84,
    sortable: true,
    whole: true,
  },
  {
    key: 'expectedOn',
    head: head.expectedOn,
    cell: (row) => formatDay(row.expectedOn, 'short'),
    width: 100,
    whole: true,
    sortable: true,
  },
  { key: 'state', head: head.state, cell: (row) => <Tag {...stateOf(row)} />, cardRole: 'tag', width: 216 },
];
