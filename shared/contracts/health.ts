import { z } from 'zod';
import { operation } from './operation';

export const readHealth = operation({
  name: 'readHealth',
  resource: 'health',
  method: 'GET',
  path: '/health',
  summary: 'Whether this server answers and reaches its database',
  answer: z.object({ state: z.literal('well'), database: z.literal('reached') }),
});
