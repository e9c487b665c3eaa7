import type { Reader } from '@/db/client';
import { endsOf, type Lane, partnerOf } from './lane-ends';
import type { Found } from './list-differences';
import { worthOfLines } from './worth-of-lines';

type Line = Found['lines'][number];
type Load = Pick<Found, 'id' | 'kind' | 'shipmentId' | 'importId' | 'reference' | 'since'> & {
  lane: Lane;
  lines: Line[];
};

/** Loads of which every unit is in question, each with what it is worth on its day. */
export async function rowsOfLoads(db: Reader, loads: readonly Load[]): Promise<Found[]> {
  const worth = await worthOfLines(
    db,
    loads.map(({ lane, since, lines }) => ({ ...partnerOf(lane), day: since, lines })),
  );
  return loads.map(({ lane, ...load }, at) => ({
    ...load,
    ...endsOf(lane),
    units: load.lines.reduce((total, line) => total + line.units, 0),
    atStake: worth[at] ?? '0',
    currency: partnerOf(lane).currency,
    state: 'open',
    ways: [],
    disputeId: null,
  }));
}

export function linesByLoad(rows: readonly (Line & { loadId: string })[]): Map<string, Line[]> {
  const found = new Map<string, Line[]>();
  for (const { loadId, ...line } of rows) found.set(loadId, [...(found.get(loadId) ?? []), line]);
  return found;
}
