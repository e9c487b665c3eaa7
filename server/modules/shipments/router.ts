import * as contracts from '@/shared/contracts/shipments';
import { file, post, read, type Route } from '../../http/route';
import { operatorDay } from '../partners/operator-day';
import { countByForm } from './count-by-form';
import { listShipments } from './list-shipments';
import { readShipment } from './read-shipment';
import { sendByForm } from './send-by-form';
import { shipmentChoices } from './shipment-choices';
import { shipmentsWorkbook } from './shipments-workbook';

export const shipmentRoutes: Route[] = [
  read(contracts.listShipments, 'see shipments', async ({ query, person, db, at }) =>
    listShipments(db, { query, person, today: await operatorDay(db, at.now) }),
  ),
  file(contracts.downloadShipments, 'see shipments', async ({ query, person, db, at }) =>
    shipmentsWorkbook(db, { query, person, today: await operatorDay(db, at.now) }),
  ),
  read(contracts.readShipment, 'see shipments', ({ params, person, db }) =>
    readShipment(db, { id: params.shipment, person }),
  ),
  read(contracts.listShipmentChoices, 'see shipments', ({ person, db, at }) =>
    shipmentChoices(db, { person, now: at.now }),
  ),
  post(contracts.sendShipment, 'send shipments', async ({ body, tx, person, at, deps }) => {
    const sent = await sendByForm(tx, {
      form: body,
      person,
      now: at.now,
      publicUrl: deps.config.PUBLIC_URL,
    });
    const { id, reference, contents } = sent;
    return { id, reference, contents, toCompany: sent.to.company.name };
  }),
  post(contracts.countShipment, 'count shipments', ({ params, body, tx, person, at }) =>
    countByForm(tx, { shipmentId: params.shipment, form: body, person, now: at.now }),
  ),
];
