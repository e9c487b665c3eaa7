import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { differences } from '@/db/schema/differences';
import type { Counted, Counting } from '../shipments/count-shipment';
import { isWithinTolerance } from './tolerance';
import { settleDifference } from './settle-difference';
import { worthOf } from './worth';

type Declared = { typeCode: string; declared: number };
type Opening = { counted: Counted; counting: Counting; declared: readonly Declared[] };

/** One difference for each type that was counted otherwise than declared; what is within tolerance settles at once. */
export async function openDifferences(
  tx: Transaction,
  { counted, counting, declared }: Opening,
): Promise<void> {
  const said = new Map(declared.map((line) => [line.typeCode, line.declared]));
  const partner = counted.to.company.kind === 'partner' ? counted.to.company : counted.from.company;
  for (const line of counting.lines) {
    const expected = said.get(line.typeCode) ?? 0;
    const openUnits = line.counted - expected;
    if (openUnits === 0) continue;
    const id = newId();
    const worth = {
      companyId: partner.id,
      currency: partner.currency,
      typeCode: line.typeCode,
      day: counting.countedOn,
    };
    await tx.insert(differences).values({
      id,
      shipmentId: counted.shipment.id,
      countId: counted.id,
      typeCode: line.typeCode,
      declared: expected,
      counted: line.counted,
      openUnits,
      partnerId: partner.id,
      atStake: await worthOf(tx, worth, Math.abs(openUnits)),
      openedOn: counting.countedOn,
      state: 'open',
      createdAt: counting.now,
    });
    if (isWithinTolerance({ declared: expected, counted: line.counted }, partner)) {
      await settleDifference(tx, {
        differenceId: id,
        way: 'within tolerance',
        units: Math.abs(openUnits),
        reason: '',
        personId: null,
        today: counting.countedOn,
        now: counting.now,
      });
    }
  }
}
