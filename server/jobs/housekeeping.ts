import { lt } from 'drizzle-orm';
import { rateLimits, requests, sessions } from '@/db/schema/access';
import type { Deps } from '../deps';
import { sealLedger } from '../modules/ledger/seal';
import type { Scheduled } from './schedule';

/** An answer is kept for repeats as long as a phone may be without a network. */
const keepKeysDays = 60;

async function clearExpired(deps: Deps): Promise<void> {
  const now = deps.clock.now();
  await deps.db.delete(sessions).where(lt(sessions.expires, Math.floor(now.getTime() / 1000)));
  await deps.db.delete(rateLimits).where(lt(rateLimits.expire, now.getTime()));
  const oldest = new Date(now.getTime() - keepKeysDays * 86_400_000).toISOString();
  await deps.db.delete(requests).where(lt(requests.createdAt, oldest));
}

/** What a well-kept house does by itself: seals the ledger, clears what has run out. */
export const housekeeping: Scheduled[] = [
  { name: 'seal ledger', every: 'hour', run: sealLedger },
  { name: 'clear expired', every: 'hour', run: clearExpired },
];
