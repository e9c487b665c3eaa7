import { sum } from '@/shared/domain/money';
import { statements } from '@/shared/text/en/statements';
import { formatMonth } from '@/shared/text/format';
import {
  amountFormat,
  dayCell,
  dayFormat,
  numberCell,
  percentFormat,
  rateFormat,
  unitsFormat,
} from '../number-formats';
import type { Cell, SheetColumn } from './ruled-sheet';
import type { Sheeted } from './sheeted';

const words = statements.document;
type Table = { columns: SheetColumn[]; rows: Cell[][] };

/** Every movement that the statement took in, the late ones with the month on which they bear. */
export function movementsSheet({ content }: Sheeted): Table {
  const columns = [
    { head: words.day, width: 12, format: dayFormat },
    { head: words.type, width: 16 },
    { head: words.movement, width: 16 },
    { head: words.units, width: 12, format: unitsFormat },
    { head: words.reference, width: 20 },
    { head: words.cause, width: 48 },
    { head: words.bearsOn, width: 18 },
  ];
  const rows = content.movements.map((movement): Cell[] => [
    dayCell(movement.date),
    movement.typeCode,
    statements.kind[movement.kind],
    movement.quantity,
    movement.reference ?? '',
    movement.cause,
    movement.lateFor ? formatMonth(movement.lateFor) : '',
  ]);
  return { columns, rows };
}

export function differencesSheet({ content }: Sheeted): Table {
  const { openDifferences: open, currency } = content;
  const columns = [
    { head: words.openedOn, width: 12, format: dayFormat },
    { head: words.reference, width: 20 },
    { head: words.type, width: 16 },
    { head: words.declared, width: 12, format: unitsFormat },
    { head: words.counted, width: 12, format: unitsFormat },
    {
      head: words.open,
      width: 12,
      format: unitsFormat,
      sum: open.reduce((total, each) => total + each.openUnits, 0),
    },
    {
      head: words.atStake,
      width: 16,
      format: amountFormat(currency),
      sum: numberCell(sum(open.map((each) => each.atStake))),
    },
  ];
  const rows = open.map((each): Cell[] => [
    dayCell(each.openedOn),
    each.reference,
    each.typeCode,
    each.declared,
    each.counted,
    each.openUnits,
    numberCell(each.atStake),
  ]);
  return { columns, rows };
}

/** The terms by which the statement was reckoned. */
export function termsSheet({ content }: Sheeted): Table {
  const money = amountFormat(content.currency);
  const columns = [
    { head: words.type, width: 16 },
    { head: words.validFrom, width: 12, format: dayFormat },
    { head: words.deposit, width: 12, format: money },
    { head: words.replacement, width: 14, format: money },
    { head: words.freeDays, width: 9, format: unitsFormat },
    { head: words.dailyFee, width: 10, format: rateFormat },
    { head: words.lostAfterDays, width: 10, format: unitsFormat },
    { head: words.usefulLifeMonths, width: 12, format: unitsFormat },
    { head: words.residualFloorPct, width: 12, format: percentFormat },
    { head: words.damageFee, width: 10, format: rateFormat },
    { head: words.cleaningFee, width: 10, format: rateFormat },
    { head: words.recoveryDays, width: 11, format: unitsFormat },
  ];
  const rows = content.terms.map((terms): Cell[] => [
    terms.containerType,
    dayCell(terms.validFrom),
    numberCell(terms.deposit),
    numberCell(terms.replacement),
    terms.freeDays,
    numberCell(terms.dailyFee),
    terms.lostAfterDays,
    terms.usefulLifeMonths,
    numberCell(terms.residualFloorPct),
    numberCell(terms.damageFee),
    numberCell(terms.cleaningFee),
    terms.recoveryDays,
  ]);
  return { columns, rows };
}
