import { type z } from 'zod';
import type { readPool } from '@/shared/contracts/pool';
import { text } from '@/shared/text/catalogue';

export type Pool = z.output<typeof readPool.answer>;

const many: Record<string, string> = text.containerTypes.kindsMany;

/** "totes", "racks": what the containers of a type are called. */
export const manyOf = (pool: Pick<Pool, 'type'>) => many[pool.type.kind] ?? pool.type.name;
