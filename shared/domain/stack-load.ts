import { add, compare, multiply } from './money';

/** What a full container and a full stack weigh, in kilograms as decimal strings. */
export interface StackLoad {
  /** One full container: tare + payload. */
  grossKg: string;
  /** A stack as high as the limit, every container full. */
  stackKg: string;
  /** What the lowest of that stack carries: all above it. */
  onLowestKg: string;
}

/**
 * Arithmetic on the figures entered, nothing more: it does not say that the stack stands or may be made.
 * Tare and payload in kilograms; `stackLimit` containers on each other, 1 or more.
 */
export function stackLoad(type: { tareKg: string; payloadKg: string; stackLimit: number }): StackLoad {
  const grossKg = add(type.tareKg, type.payloadKg);
  return {
    grossKg,
    stackKg: multiply(grossKg, type.stackLimit),
    onLowestKg: multiply(grossKg, type.stackLimit - 1),
  };
}

/**
 * Reference mass for lifting by hand under good conditions: 25 kg, ISO 11228-1:2003, annex (quoted from
 * memory; the annex gives lower masses, 20 or 15 kg, for women). A mark for a caution, not a limit that
 * makes lighter loads safe.
 */
export const HANDLING_REFERENCE_KG = '25';

/** What a person would lift: a tote or lid with its payload, of anything larger the empty container. */
export function handledKg(type: { kind: string; tareKg: string; payloadKg: string }): string {
  return type.kind === 'tote' || type.kind === 'lid' ? add(type.tareKg, type.payloadKg) : type.tareKg;
}

export const isAboveHandlingReference = (kilograms: string): boolean =>
  compare(kilograms, HANDLING_REFERENCE_KG) > 0;
