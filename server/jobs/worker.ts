import type { Deps } from '../deps';
import type { Mailer } from '../mail/send-waiting';
import { sendWaiting } from '../mail/send-waiting';
import { type JobHandler, runNextJob } from './job-queue';
import { runDue, type Scheduled } from './schedule';

type Work = { mailer: Mailer; handlers: Record<string, JobHandler>; scheduled: readonly Scheduled[] };

/** Looks for work about once a second. `stop` lets what runs come to its end. */
export function startWorker(deps: Deps, work: Work): { stop: () => Promise<void> } {
  let stopped = false;
  let timer: NodeJS.Timeout | undefined;
  let turn: Promise<void> = Promise.resolve();

  const takeTurn = async (): Promise<void> => {
    try {
      await runDue(deps, work.scheduled);
      await sendWaiting(deps, work.mailer);
      while (!stopped && (await runNextJob(deps, work.handlers)));
    } catch (error) {
      deps.logger.warn({ err: error }, 'work put off');
    }
    if (!stopped) timer = setTimeout(begin, 1000);
  };
  const begin = (): void => {
    turn = takeTurn();
  };
  begin();
  return {
    stop: async () => {
      stopped = true;
      clearTimeout(timer);
      await turn;
    },
  };
}
