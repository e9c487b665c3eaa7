import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

import { assess } from '@/shared/domain/assessment';

interface Example {
  about: string;
  input: unknown;
  expected: unknown;
}

const folder = join(__dirname, '../../fixtures/assess');
const examples = readdirSync(folder)
  .filter((name) => name.endsWith('.json'))
  .map((name) => ({ name, ...(JSON.parse(readFileSync(join(folder, name), 'utf8')) as Example) }));

describe('the worked examples of the rules', () => {
  it('are all here', () => expect(examples).toHaveLength(14));

  it.each(examples)('$name: $about', ({ input, expected }) => {
    expect(assess(input)).toEqual(expected);
  });
});
