import { assess, type AssessmentEvent } from '@/shared/domain/assessment';

const terms = (validFrom: string, deposit: string, lostAfterDays: number) => ({
  containerType: 'RACK-3',
  validFrom,
  deposit,
  replacement: '100.00',
  freeDays: 0,
  dailyFee: '1',
  lostAfterDays,
  usefulLifeMonths: 60,
  residualFloorPct: '20',
  damageFee: '0',
  cleaningFee: '0',
  recoveryDays: 30,
});

let counter = 0;
const event = (
  kind: 'issued' | 'lost' | 'found' | 'returned',
  date: string,
  quantity: number,
): AssessmentEvent => ({
  id: `e${(counter += 1)}`,
  date,
  containerType: 'RACK-3',
  kind,
  quantity,
});

const february = (events: AssessmentEvent[]) =>
  assess({
    currency: 'EUR',
    from: '2026-02-01',
    to: '2026-02-28',
    terms: [terms('2026-01-01', '4.00', 40), terms('2026-01-21', '6.00', 20)],
    containerTypes: [{ code: 'RACK-3', inServiceFrom: '2026-01-01' }],
    events,
  }).lines[0];

describe('losses by age among other events', () => {
  // 10 January + 40 days and 30 January + 20 days both fall on 19 February.
  const issues = [event('issued', '2026-01-10', 2), event('issued', '2026-01-30', 2)];

  it('of two layers lost on one day the older one is found first', () => {
    const line = february([...issues, event('found', '2026-02-20', 2)]);
    expect(line?.deposit).toMatchObject({
      opening: '20.00',
      forfeited: '20.00',
      reinstated: '8.00',
      closing: '8.00',
    });
  });

  it('a younger layer under shorter terms is lost before an older one, and found before it', () => {
    const early = [event('issued', '2026-01-15', 1), event('issued', '2026-01-22', 1)];
    // Lost on 24 and on 11 February.
    const line = february([...early, event('found', '2026-02-25', 1)]);
    expect(line?.deposit).toMatchObject({ forfeited: '10.00', reinstated: '6.00' });
  });

  it('what comes back on the day is returned and not lost, and no fee runs for that day', () => {
    const line = february([...issues, event('returned', '2026-02-19', 3)]);
    expect(line?.units).toMatchObject({ returned: 3, lost: 1, closing: 0 });
    // Four units on each of the 18 days from 1 to 18 February.
    expect(line?.charges.dwell.unitDays).toBe(72);
  });

  it('a declared loss of that day stands before a loss by age, and both can be found only later', () => {
    const line = february([...issues, event('lost', '2026-02-19', 1), event('found', '2026-02-20', 3)]);
    expect(line?.units).toMatchObject({ lost: 4, found: 3, closing: 3 });
    expect(line?.deposit.reinstated).toBe('14.00');
    // One month in service on the day: 100 × 59/60 = 98.33 less 4.00 or 6.00; three of the four are credited.
    expect(line?.charges.loss).toEqual({ units: 4, recovered: '280.99', amount: '92.33' });
  });

  it('found units start a new age and can be lost by it again', () => {
    const line = february([
      event('issued', '2026-01-21', 1),
      event('lost', '2026-01-22', 1),
      event('found', '2026-02-03', 1),
    ]);
    // Found on 3 February, lost again 20 days later, on the 23rd.
    expect(line?.units).toMatchObject({ opening: 0, found: 1, lost: 1, closing: 0 });
    expect(line?.charges.dwell.unitDays).toBe(20);
  });
});
