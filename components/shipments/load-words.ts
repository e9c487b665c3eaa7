import type { ShipmentRow } from '@/shared/contracts/shipments';
import { formatUnits } from '@/shared/text/format';

/** "400 Tote 600×400×280 · 20 Lid 1200×800": what was declared, or what was counted where nothing was. */
export function loadOf(row: Pick<ShipmentRow, 'lines'>): string {
  return row.lines
    .filter((line) => line.declared > 0 || (line.counted ?? 0) > 0)
    .map((line) => `${formatUnits(line.declared || (line.counted ?? 0))} ${line.typeName}`)
    .join(' · ');
}
