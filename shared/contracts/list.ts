import { z } from 'zod';

/** What every list can be asked: a page by key, a search, a sort. Filters are added per list. */
export const listQuery = z.object({
  after: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
  search: z.string().trim().max(100).optional(),
  sort: z.string().max(40).optional(),
});

/** A page of a list; `next` is the key to ask the following page with, null at the end. */
export function pageOf<Row extends z.ZodType>(row: Row) {
  return z.object({ rows: z.array(row), next: z.string().nullable() });
}
