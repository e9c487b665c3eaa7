import type { JobHandler } from './job-queue';
import type { Scheduled } from './schedule';
import { housekeeping } from './housekeeping';
import { importJob } from '../modules/imports/confirm-import';
import { runImport } from '../modules/imports/run-import';
import { bookCheck } from '../modules/balances/check-book';
import { monthJobs } from '../modules/months/close-month';
import { resetJob, sendReset } from '../modules/session/send-reset';
import { draftMonth } from '../modules/statements/draft-month';
import { issueMonth } from '../modules/statements/issue-month';
import { watchSilence } from '../modules/statements/silence';
import { automaticCountJobs, automaticCounts } from '../modules/shipments/auto-count';

/** What each kind of job does. */
export const jobHandlers: Record<string, JobHandler> = {
  ...automaticCountJobs,
  [importJob]: runImport,
  [resetJob]: sendReset,
  [monthJobs.drafts]: draftMonth,
  [monthJobs.issue]: issueMonth,
};

/** What happens by the clock. */
export const scheduled: Scheduled[] = [
  ...housekeeping,
  automaticCounts,
  bookCheck,
  { name: 'statements', every: 'hour', run: watchSilence },
];
