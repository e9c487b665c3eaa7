import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

import { sizePool } from '@/shared/domain/pool-size';

import { closely } from './pool-size/closely';

const folder = join(__dirname, '../../fixtures/sizing');
const examples = readdirSync(folder)
  .filter((name) => name.endsWith('.json'))
  .map((name) => ({
    name,
    ...(JSON.parse(readFileSync(join(folder, name), 'utf8')) as { input: unknown; expected: unknown }),
  }));

describe('the worked examples of the rules', () => {
  it('are all here', () => expect(examples).toHaveLength(4));

  it.each(examples)('$name: every figure within 1e-9, whole numbers exactly', ({ input, expected }) => {
    expect(sizePool(input)).toEqual(closely(expected));
  });
});
