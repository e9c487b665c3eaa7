import { decimal } from './money';

/** A decimal string without the zeros that a column pads it with: "4.5000" is "4.5", "20.000" is "20". */
export function plainDecimal(value: string): string {
  const checked = decimal(value);
  return checked.includes('.') ? checked.replace(/\.?0+$/, '') : checked;
}
