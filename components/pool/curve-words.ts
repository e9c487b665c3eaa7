import type { ReckonedPool } from '@/shared/contracts/pool-sizing';
import { text } from '@/shared/text/catalogue';

const words = text.pool;

/** The curve in sentences: what the needed size does, and what today's does. */
export function curveWords({ atNeeded, atToday }: ReckonedPool): string {
  const needed = words.summaryNeeded(atNeeded.poolSize, atNeeded.cover, atNeeded.fallbackShare);
  const today =
    atToday === null
      ? words.summaryNoToday
      : words.summaryToday(atToday.poolSize, atToday.cover, atToday.fallbackShare);
  return `${needed} ${today}`;
}
