import type { ShipmentRow } from '@/shared/contracts/shipments';
import { text } from '@/shared/text/catalogue';
import type { Tone } from '../theme/meaning';
import { differenceOf } from './difference-words';

const words = text.shipments;

/** The state of a shipment as its tag says it: what differs comes before what is done. */
export function stateOf(row: Pick<ShipmentRow, 'state' | 'lines'>): { tone: Tone; label: string } {
  if (row.state === 'on the way') return { tone: 'moving', label: words.state['on the way'] };
  const open = row.lines.filter((line) => line.openUnits !== 0);
  const [only, ...more] = open;
  if (!only) return { tone: 'done', label: words.state.counted };
  return more.length === 0 ? differenceOf(only.openUnits) : { tone: 'differs', label: words.state.differs };
}
