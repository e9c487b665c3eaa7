import type { Product } from '../../support/app';
import { aLane } from '../../support/lane';

/** A lane with an engineer, and a part that travels in its type: 1 760 a day, 12 to a container. */
export async function aPoolScene(product: Product) {
  const lane = await aLane(product);
  const sif = await product.aPerson(lane.operator, ['engineer'], { name: 'Sif Holm' });
  const engineer = await product.as(sif);
  const part = await engineer.post('/parts', partForm(lane));
  return { ...lane, sif, engineer, partId: part.body.id as string };
}
export type PoolScene = Awaited<ReturnType<typeof aPoolScene>>;

type Ends = { type: { code: string }; dock: { id: string }; plant: { id: string } };

export const partForm = (lane: Ends, given: Record<string, unknown> = {}) => ({
  number: 'HX-2210',
  name: 'heat exchanger coil',
  typeCode: lane.type.code,
  supplierSiteId: lane.dock.id,
  plantSiteId: lane.plant.id,
  unitsPerContainer: 12,
  unitsPerDayMean: '1760',
  unitsPerDaySd: '240',
  ...given,
});

const leg = (name: string, stretch: string, [mean, sd]: [string, string]) => ({
  name,
  stretch,
  days: { mean, sd },
});

export const plan = (given: Record<string, unknown> = {}) => ({
  legs: [
    leg('filled at the supplier', 'at the partner', ['1.5', '0.5']),
    leg('on the way to the plant', 'to the plant', ['1', '0.3']),
    leg('full stock at the plant', 'at the plant', ['2', '1']),
    leg('empties at the plant', 'at the plant', ['2.5', '1.2']),
    leg('on the way back', 'back', ['1', '0.3']),
  ],
  travel: 'independent',
  bufferDays: '2',
  coverPct: '98',
  heldPct: '1.5',
  repairPct: '2',
  lossPerTripPct: '0.2',
  workingDaysPerYear: 235,
  ...given,
});

/** What sizePool takes for that plan and part. */
export const sizingInput = {
  flows: [{ part: 'HX-2210', unitsPerDay: { mean: 1760, sd: 240 }, unitsPerContainer: 12 }],
  legs: plan().legs.map(({ name, days }) => ({
    name,
    days: { mean: Number(days.mean), sd: Number(days.sd) },
  })),
  travel: 'independent',
  bufferDays: 2,
  coverProbability: 0.98,
  heldPct: 1.5,
  repairPct: 2,
  lossPerTripPct: 0.2,
  workingDaysPerYear: 235,
};
