import type { Reader } from '@/db/client';
import type { QueryOf } from '@/shared/contracts/operation';
import type { downloadShipments, ShipmentRow } from '@/shared/contracts/shipments';
import { shipments as words } from '@/shared/text/en/shipments';
import { everyPage } from '../../documents/every-page';
import { listWorkbook, type SheetColumn } from '../../documents/list-workbook';
import { workbookMediaType } from '../../documents/statement-workbook';
import type { Person } from '../../http/person';
import type { FileAnswer } from '../../http/route';
import { listShipments } from './list-shipments';

type Asked = { query: QueryOf<typeof downloadShipments>; person: Person; today: string };
type Line = { shipment: ShipmentRow; line: ShipmentRow['lines'][number] };

const head = words.column;
const columns: readonly SheetColumn<Line>[] = [
  { head: head.reference, width: 18, text: ({ shipment }) => shipment.reference },
  { head: head.contents, text: ({ shipment }) => words.contents[shipment.contents] },
  { head: head.from, width: 30, text: ({ shipment }) => `${shipment.from.company}, ${shipment.from.site}` },
  { head: head.to, width: 30, text: ({ shipment }) => `${shipment.to.company}, ${shipment.to.site}` },
  { head: head.leftOn, day: ({ shipment }) => shipment.leftOn },
  { head: head.expectedOn, day: ({ shipment }) => shipment.expectedOn },
  { head: words.countedDay, day: ({ shipment }) => shipment.countedOn },
  { head: words.typeCode, text: ({ line }) => line.typeCode },
  { head: words.type, width: 26, text: ({ line }) => line.typeName },
  { head: words.declared, units: ({ line }) => line.declared },
  { head: words.counted, units: ({ line }) => line.countedNow },
  { head: words.damaged, units: ({ line }) => line.damaged },
  { head: words.dirty, units: ({ line }) => line.dirty },
  { head: words.openDifference, width: 18, units: ({ line }) => line.openUnits },
];

/** The list of shipments as a spreadsheet, a line for each container type. */
export function shipmentsWorkbook(db: Reader, asked: Asked): FileAnswer {
  return {
    name: `${words.head} ${asked.today}.xlsx`,
    mediaType: workbookMediaType,
    content: listWorkbook({ name: words.head, columns, pages: pagesOf(db, asked) }),
  };
}

async function* pagesOf(db: Reader, { query, ...asked }: Asked): AsyncGenerator<Line[]> {
  for await (const shipments of everyPage((page) =>
    listShipments(db, { ...asked, query: { ...query, ...page } }),
  )) {
    yield shipments.flatMap((shipment) => shipment.lines.map((line) => ({ shipment, line })));
  }
}
