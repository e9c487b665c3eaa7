import type { JobHandler } from './job-queue';
import type { Scheduled } from './schedule';

/** What each kind of job does. */
export const jobHandlers: Record<string, JobHandler> = {};

/** What happens by the clock. */
export const scheduled: Scheduled[] = [];
