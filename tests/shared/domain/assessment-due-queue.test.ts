import fc from 'fast-check';

import { type Due, DueQueue } from '@/shared/domain/assessment/due-queue';

const SEED = 20260304;

describe('the queue of layers that fall due', () => {
  it('is empty at first and after its last item', () => {
    const queue = new DueQueue<Due>();
    expect(queue.first()).toBeUndefined();
    queue.add({ dueDay: 5, sequence: 0 });
    queue.removeFirst();
    queue.removeFirst();
    expect(queue.first()).toBeUndefined();
  });

  it(`gives the earliest day first and of one day the oldest layer, while more are added, seed ${SEED}`, () => {
    // null takes the first away, a number adds a layer that falls due on that day.
    const steps = fc.array(fc.option(fc.nat(12), { freq: 2 }), { size: 'max', maxLength: 60 });
    fc.assert(
      fc.property(steps, (each) => {
        const queue = new DueQueue<Due>();
        let expected: Due[] = [];
        each.forEach((dueDay, sequence) => {
          if (dueDay === null) {
            queue.removeFirst();
            expected = expected.slice(1);
          } else {
            queue.add({ dueDay, sequence });
            expected.push({ dueDay, sequence });
            expected.sort((a, b) => a.dueDay - b.dueDay || a.sequence - b.sequence);
          }
          expect(queue.first()).toEqual(expected[0]);
        });
      }),
      { seed: SEED, numRuns: 500 },
    );
  });
});
