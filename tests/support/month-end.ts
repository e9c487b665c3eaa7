import { inTransaction } from '@/db/transaction';
import { countShipment } from '@/server/modules/shipments/count-shipment';
import { sendShipment } from '@/server/modules/shipments/send-shipment';
import type { Product } from './app';

/** An operator with finance, a partner with a manager, two types with terms, and movements posted on chosen days. */
export async function aMonthEnd(product: Product) {
  const operator = await product.aCompany({ kind: 'operator', name: 'Fennmark Heat Pumps' });
  const plant = await product.aSite(operator, { name: 'Tarnby Assembly' });
  const mikkel = await product.aPerson(operator, ['finance'], { name: 'Mikkel Thorn' });
  const ane = await product.aPerson(operator, ['coordinator'], { name: 'Ane Ravn' });
  const tote = await product.aType();
  const lid = await product.aType({ name: 'Lid 1200×800', kind: 'lid' });

  const aPartner = async (given: Parameters<Product['aCompany']>[0] = {}) => {
    const company = await product.aCompany({ taxRate: '25', ...given });
    const dock = await product.aSite(company);
    const manager = await product.aPerson(company, ['manager'], { name: `Manager of ${company.name}` });
    return { company, dock, manager, caller: await product.as(manager) };
  };
  type Partner = Awaited<ReturnType<typeof aPartner>>;

  const move = (ends: { from: string; to: string }, on: string, counted: Counted[]) =>
    inTransaction(product.deps.db, async (tx) => {
      const now = `${on}T10:00:00.000Z`;
      const lines = counted.map(({ typeCode, units, declared }) => ({
        typeCode,
        declared: declared ?? units,
      }));
      const form = {
        contents: 'empties' as const,
        leftOn: on,
        expectedOn: on,
        origin: 'form' as const,
        personId: null,
      };
      const sent = await sendShipment(tx, { ...form, fromSiteId: ends.from, toSiteId: ends.to, lines, now });
      await countShipment(tx, {
        shipmentId: sent.id,
        countedOn: on,
        lines: counted.map(({ typeCode, units, damaged = 0 }) => ({
          typeCode,
          counted: units,
          damaged,
          dirty: 0,
        })),
        source: 'person',
        personId: null,
        now,
      });
      return sent;
    });

  return {
    operator,
    plant,
    tote,
    lid,
    mikkel,
    finance: await product.as(mikkel),
    coordinator: await product.as(ane),
    aPartner,
    /** Empties that the partner counted on a day. */
    issue: ({ dock }: Partner, on: string, counted: Counted[]) =>
      move({ from: plant.id, to: dock.id }, on, counted),
    /** What the plant counted back from the partner on a day. */
    giveBack: ({ dock }: Partner, on: string, counted: Counted[]) =>
      move({ from: dock.id, to: plant.id }, on, counted),
  };
}

type Counted = { typeCode: string; units: number; declared?: number; damaged?: number };
export type MonthEnd = Awaited<ReturnType<typeof aMonthEnd>>;
