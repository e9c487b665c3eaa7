import { inTransaction } from '@/db/transaction';
import { countShipment } from '@/server/modules/shipments/count-shipment';
import { sendShipment } from '@/server/modules/shipments/send-shipment';
import { addDays } from '@/shared/domain/calendar';
import { type Scene, today } from './scene';
import type { Stage } from './stage';

type Load = Record<string, number>;
type Sending = { contents: 'empties' | 'fulls'; from: string; to: string; load: Load; on?: string };

/** A shipment that has left, posted through the service the API uses. */
export async function sent(stage: Stage, sending: Sending): Promise<{ id: string; reference: string }> {
  const on = sending.on ?? today();
  return inTransaction(stage.db, (tx) =>
    sendShipment(tx, {
      contents: sending.contents,
      fromSiteId: sending.from,
      toSiteId: sending.to,
      leftOn: on,
      expectedOn: sending.on ? on : addDays(on, 1),
      lines: Object.entries(sending.load).map(([typeCode, declared]) => ({ typeCode, declared })),
      origin: 'form',
      personId: null,
      now: `${on}T08:00:00.000Z`,
    }),
  );
}

type Counting = { shipment: { id: string }; load: Load; on?: string };

export async function counted(stage: Stage, { shipment, load, on = today() }: Counting): Promise<void> {
  await inTransaction(stage.db, (tx) =>
    countShipment(tx, {
      shipmentId: shipment.id,
      countedOn: on,
      lines: Object.entries(load).map(([typeCode, units]) => ({
        typeCode,
        counted: units,
        damaged: 0,
        dirty: 0,
      })),
      source: 'person',
      personId: null,
      now: `${on}T10:00:00.000Z`,
    }),
  );
}

type OnStage = { stage: Stage; scene: Scene };

/** Empties on their way from Tarnby to Kestrel. */
export const emptiesToKestrel = ({ stage, scene }: OnStage, load: Load, on?: string) =>
  sent(stage, {
    contents: 'empties',
    from: scene.sites.tarnby.id,
    to: scene.sites.kestrel.id,
    load,
    ...(on ? { on } : {}),
  });
