import { assess, type AssessmentEvent, type AssessmentInput } from '@/shared/domain/assessment';
import { addDays } from '@/shared/domain/calendar';

/** RULES and the open issue: 50 000 events of one partner take at most 12 times as long as 5 000. */
const SMALL = 5_000;
const LARGE = 50_000;
const MOST = 12;
const RUNS = 7;

export interface AssessFigures {
  smallMs: number;
  largeMs: number;
  ratio: number;
}

/**
 * Three types over five years in the mix of a busy partner. The more events, the more layers are open at once,
 * so that work per event and layer would show as a square.
 */
function history(count: number): AssessmentInput {
  const terms = ['TOTE-64', 'TRAY-12', 'RACK-3'].flatMap((containerType, type) =>
    Array.from({ length: 20 }, (_, version) => ({
      containerType,
      validFrom: addDays('2022-01-01', version * 90),
      deposit: '4.50',
      replacement: '18.00',
      freeDays: 14,
      dailyFee: version % 2 === 0 ? '0.03' : '0.035',
      lostAfterDays: version % 3 === 0 ? 400 + type : 300 + version,
      usefulLifeMonths: 60,
      residualFloorPct: '20',
      damageFee: '3.20',
      cleaningFee: '0.40',
      recoveryDays: 60,
    })),
  );
  const events = Array.from({ length: count }, (_, n) =>
    eventOf(n, addDays('2022-01-01', Math.floor((n * 1800) / count)), count),
  );
  return {
    currency: 'EUR',
    from: '2026-03-01',
    to: '2026-11-30',
    terms,
    containerTypes: ['TOTE-64', 'TRAY-12', 'RACK-3'].map((code) => ({ code, inServiceFrom: '2021-06-01' })),
    events,
  };
}

/** By turns of ten: six issues, two returns smaller than the issues, a loss and every other time a find. */
function eventOf(n: number, date: string, count: number): AssessmentEvent {
  const containerType = ['TOTE-64', 'TRAY-12', 'RACK-3'][Math.floor(n / 10) % 3] ?? 'TOTE-64';
  const of = { id: `e${n}`, date, containerType };
  const turn = n % 10;
  if (turn < 6) return { ...of, kind: 'issued', quantity: 40 };
  if (turn < 8) return { ...of, kind: 'returned', quantity: 70 };
  if (turn === 8) return { ...of, kind: 'lost', quantity: 4 };
  // Not before losses of earlier days are there to be found.
  return n % 20 === 9 && n > count / 10
    ? { ...of, kind: 'found', quantity: 3 }
    : { ...of, kind: 'corrected', corrects: `e${n - 9}`, quantity: -3 };
}

function medianMs(input: AssessmentInput): number {
  const times = Array.from({ length: RUNS }, () => {
    const start = performance.now();
    assess(input);
    return performance.now() - start;
  }).sort((a, b) => a - b);
  return times[Math.floor(RUNS / 2)] ?? NaN;
}

/** Median times in milliseconds and their ratio; throws when it is over the limit. */
export async function benchAssess(): Promise<{ name: string; figures: AssessFigures }> {
  const [small, large] = [history(SMALL), history(LARGE)];
  // The first runs are the compiler's, not ours.
  for (let warm = 0; warm < 3; warm += 1) assess(small);
  const smallMs = medianMs(small);
  const largeMs = medianMs(large);
  const ratio = largeMs / smallMs;
  if (!(ratio <= MOST))
    throw new Error(`assess: ${LARGE} events take ${ratio.toFixed(1)} times as long as ${SMALL}`);
  return { name: 'assess', figures: { smallMs, largeMs, ratio } };
}

async function print(): Promise<void> {
  const { smallMs, largeMs, ratio } = (await benchAssess()).figures;
  const [small, large] = [smallMs, largeMs].map((ms) => ms.toFixed(1));
  console.log(`${SMALL} events ${small} ms, ${LARGE} events ${large} ms, ratio ${ratio.toFixed(2)}`);
}

if (require.main === module) void print();
