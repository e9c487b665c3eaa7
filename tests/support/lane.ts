import type { Product } from './app';

/** An operator and a partner with a site each, their people signed in, a container type with terms, and stock at the plant. */
export async function aLane(product: Product) {
  const operator = await product.aCompany({ kind: 'operator', name: 'Fennmark Heat Pumps' });
  const partner = await product.aCompany({ name: 'Kestrel Coil Works' });
  const plant = await product.aSite(operator, { name: 'Tarnby Assembly' });
  const dock = await product.aSite(partner, { name: 'Kestrel, dock 2' });
  const type = await product.aType();
  const lid = await product.aType({ name: 'Lid 1200×800', kind: 'lid', unitsPerStack: 20 });
  for (const { code } of [type, lid]) await product.someTerms(partner, code);
  const ane = await product.aPerson(operator, ['coordinator'], { name: 'Ane Ravn' });
  const ivo = await product.aPerson(partner, ['clerk'], { name: 'I. Madsen' });
  return {
    operator,
    partner,
    plant,
    dock,
    type,
    lid,
    ane,
    ivo,
    coordinator: await product.as(ane),
    clerk: await product.as(ivo),
  };
}
export type Lane = Awaited<ReturnType<typeof aLane>>;

type Load = Record<string, number>;

/** The form for empties from the lane's plant to its partner, leaving today by the tests' clock. */
export function empties(lane: Lane, load: Load = { [lane.type.code]: 400, [lane.lid.code]: 20 }) {
  return {
    fromSiteId: lane.plant.id,
    toSiteId: lane.dock.id,
    leftOn: '2026-03-20',
    expectedOn: '2026-03-21',
    lines: Object.entries(load).map(([typeCode, declared]) => ({ typeCode, declared })),
  };
}

/** The form for fulls the other way. */
export function fulls(lane: Lane, load: Load) {
  return { ...empties(lane, load), fromSiteId: lane.dock.id, toSiteId: lane.plant.id };
}

/** A count of so many of each type, none damaged. */
export function counted(load: Load) {
  return { lines: Object.entries(load).map(([typeCode, units]) => ({ typeCode, counted: units })) };
}

/** Sends empties and answers their id. */
export async function sentEmpties(lane: Lane, load?: Load): Promise<string> {
  const { body, status } = await lane.coordinator.post('/shipments', empties(lane, load));
  if (status !== 200) throw new Error(`sending answered ${status} ${JSON.stringify(body)}`);
  return body.id as string;
}
