import type { JobHandler } from './job-queue';
import type { Scheduled } from './schedule';
import { automaticCountJobs, automaticCounts } from '../modules/shipments/auto-count';

/** What each kind of job does. */
export const jobHandlers: Record<string, JobHandler> = { ...automaticCountJobs };

/** What happens by the clock. */
export const scheduled: Scheduled[] = [automaticCounts];
