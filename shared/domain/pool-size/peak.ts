import { type PoolInput, type TravelMode } from './input';
import { CannotSize } from './refusal';

/** Containers dispatched in a working day: mean m and variance v. */
export interface Dispatch {
  mean: number;
  variance: number;
}

/** Containers in the loop just after a day's dispatch: mean and variance. */
export interface Peak {
  mean: number;
  variance: number;
}

/** RULES 7: m = Σ mean ÷ unitsPerContainer, v = Σ (sd ÷ unitsPerContainer)². Refuses a demand of nothing. */
export function dispatchPerDay(flows: PoolInput['flows']): Dispatch {
  const dispatch = flows.reduce(
    (sum, { unitsPerDay, unitsPerContainer }) => ({
      mean: sum.mean + unitsPerDay.mean / unitsPerContainer,
      variance: sum.variance + (unitsPerDay.sd / unitsPerContainer) ** 2,
    }),
    { mean: 0, variance: 0 },
  );
  if (dispatch.mean === 0) {
    throw new CannotSize('nothing goes out', { at: 'flows', because: 'every part has a demand of 0 a day' });
  }
  return dispatch;
}

/**
 * RULES 7, Peak. Of each day's dispatch a share p_k is still out k days later. Independent: each container
 * decides for itself, so the day's number is thinned binomially. Together: all of it is out, or none; the
 * rules' (v + m²) p − m² p² is written as v p + m² p (1 − p), which loses nothing to cancelling.
 */
export function peakInLoop(dispatch: Dispatch, stillOut: readonly number[], travel: TravelMode): Peak {
  const { mean: m, variance: v } = dispatch;
  const varianceOfDay =
    travel === 'independent'
      ? (p: number) => v * p * p + m * p * (1 - p)
      : (p: number) => v * p + m * m * p * (1 - p);
  return stillOut.reduce(
    (peak, p) => ({ mean: peak.mean + m * p, variance: peak.variance + varianceOfDay(p) }),
    { mean: 0, variance: 0 },
  );
}
