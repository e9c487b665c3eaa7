import type { z } from 'zod';
import { fieldMessage } from '@/shared/text/field-message';
import { type BadField, Problem } from '@/shared/problems/problems';

/** Parses by schema; all bad fields at once, each by its path within `where`. */
export function parsed(
  schema: z.ZodType | undefined,
  value: unknown,
  where: 'params' | 'query' | 'body',
): unknown {
  if (!schema) return undefined;
  const result = schema.safeParse(value, { error: fieldMessage });
  if (result.success) return result.data;
  if (where === 'params') throw new Problem('not found');
  throw new Problem('not valid', { fields: badFieldsOf(result.error) });
}

export function badFieldsOf(error: z.ZodError): BadField[] {
  return error.issues
    .slice(0, 200)
    .map((issue) => ({ path: issue.path.map(String).join('.'), message: issue.message }));
}
