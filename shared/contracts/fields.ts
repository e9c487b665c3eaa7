import { z } from 'zod';

/** Fields that many contracts share. Text is trimmed; control characters are refused (no header can be forged). */
export const id = z.uuid();

const noControls = /^[^\u0000-\u001f\u007f-\u009f\u2028\u2029]*$/;
const noControlsButBreaks = /^[^\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]*$/;

/** One line of text, 1 to `most` characters. */
export const line = (most: number) =>
  z.string().trim().min(1).max(most).regex(noControls, 'One line of plain text');
/** One line that may be empty. */
export const lineOrEmpty = (most: number) =>
  z.string().trim().max(most).regex(noControls, 'One line of plain text');
/** Several lines of text. */
export const prose = (most: number) =>
  z.string().trim().min(1).max(most).regex(noControlsButBreaks, 'Plain text');
export const proseOrEmpty = (most: number) =>
  z.string().trim().max(most).regex(noControlsButBreaks, 'Plain text');

/** Codes of types, sites and companies: capitals, digits, hyphen. */
export const code = z
  .string()
  .trim()
  .regex(/^[A-Z0-9][A-Z0-9-]{0,19}$/, {
    error: ({ input }) => (input === '' ? undefined : 'Capitals, digits and hyphens, at most 20'),
  });

export const email = z
  .email()
  .max(200)
  .transform((value) => value.toLowerCase());

/** 'YYYY-MM' */
export const month = z.string().regex(/^\d{4}-(0[1-9]|1[0-2])$/, 'A month like 2026-03');

/** A UTC instant, ISO 8601. */
export const instant = z.iso.datetime({ offset: false });

/** For a field that is needed only beside others: told together with whatever else is wrong, not after it. */
export const needed = (path: string) => ({
  path: [path],
  message: 'This is needed',
  when: ({ value }: { value: unknown }) => typeof value === 'object' && value !== null,
});
