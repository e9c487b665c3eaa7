import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { reconcile } from '@/shared/domain/reconciliation';
import { offeredPairs } from './reconciliation-papers';

const folder = path.join(__dirname, '../../fixtures/reconcile');

const examples = readdirSync(folder)
  .filter((file) => file.endsWith('.json'))
  .map((file) => ({ file, ...JSON.parse(readFileSync(path.join(folder, file), 'utf8')) }));

test('there are nine examples', () => expect(examples).toHaveLength(9));

test.each(examples)('$file: $about', ({ input, expected }) => {
  const { suggestedPairs, ...rest } = expected;
  const outcome = reconcile(input);
  expect(outcome).toMatchObject(rest);
  expect(offeredPairs(outcome)).toEqual(suggestedPairs);
});
