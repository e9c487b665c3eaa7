import { z } from 'zod';
import { compare } from '../domain/money';

/** A plain decimal of 0 or more with at most so many decimals and not above `most`; one message for each fault. */
export function measure({ decimals, most, like }: { decimals: number; most: string; like: string }) {
  const said = `A number like ${like}, at least 0 and with at most ${decimals} decimal${decimals === 1 ? '' : 's'}`;
  return z
    .string()
    .regex(new RegExp(`^(0|[1-9]\\d{0,11})(\\.\\d{1,${decimals}})?$`), {
      error: ({ input }) => (input === '' ? undefined : said),
      abort: true,
    })
    .refine((value) => compare(value, most) <= 0, { error: `Not above ${most}` });
}
