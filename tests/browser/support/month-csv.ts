import { addDays } from '@/shared/domain/calendar';
import { monthFileHeads } from '../../support/month-file';
import { today } from './scene';

type Row = {
  side: 'shipment' | 'receipt';
  reference?: string;
  lane?: string;
  daysAgo: number;
  type?: string;
  units: number | string;
};

/** A file as a portal writes it: semicolons, Windows line ends. */
export function csvUpload(name: string, rows: readonly Row[]) {
  const lines = rows.map(({ side, reference = '', lane = 'TARNBY;KESTREL', daysAgo, type, units }) =>
    [side, reference, lane, addDays(today(), -daysAgo), type ?? 'TOTE-64', units, '', ''].join(';'),
  );
  return {
    name,
    mimeType: 'text/csv',
    buffer: Buffer.from([monthFileHeads.join(';'), ...lines, ''].join('\r\n')),
  };
}

/**
 * A month in small: one receipt counts 8 fewer, two shipments are so alike that a receipt without a reference may belong
 * to either, three rows cannot be posted, and enough plain shipments that posting takes a while.
 */
export const aMonthInSmall = () =>
  csvUpload('november.csv', [
    { side: 'shipment', reference: 'F-1', daysAgo: 4, units: 400 },
    { side: 'receipt', reference: 'F-1', daysAgo: 3, units: 392 },
    { side: 'shipment', reference: 'F-2', daysAgo: 4, units: 120 },
    { side: 'shipment', reference: 'F-3', daysAgo: 4, units: 120 },
    { side: 'receipt', daysAgo: 3, units: 120 },
    { side: 'shipment', reference: 'F-4', daysAgo: 2, type: 'TOTE-99', units: 40 },
    { side: 'shipment', reference: 'F-5', daysAgo: 2, units: 12.5 },
    { side: 'receipt', reference: 'F-6', daysAgo: 2, units: -4 },
    ...Array.from({ length: 120 }, (_, at) => ({
      side: 'shipment' as const,
      reference: `G-${at + 1}`,
      lane: 'OSTREL;ORRIN',
      daysAgo: 1,
      units: 8 + at,
    })),
  ]);
