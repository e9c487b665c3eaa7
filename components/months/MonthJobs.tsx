import type { MonthJob } from '@/shared/contracts/months';
import { text } from '@/shared/text/catalogue';
import { Box } from '../ui/Box';
import { Link } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { ProgressBar } from '../ui/ProgressBar';
import { Text } from '../ui/Text';
import type { MonthPage } from './MonthScreen';

const words = text.months;

/** What is being worked at, what failed, and which partners could not be reckoned. */
export function MonthJobs({ page }: { page: MonthPage }) {
  return page.jobs.map((job) => <Job key={job.kind} job={job} />);
}

function Job({ job }: { job: MonthJob }) {
  if (job.state === 'failed') return <Notice kind="error">{words.failed(job.problem ?? '')}</Notice>;
  if (job.state === 'done') return <Refused job={job} />;
  const label = job.kind === 'drafts' ? words.draftsRunning : words.issueRunning;
  return (
    <Box gap="xs">
      <ProgressBar label={label} done={job.done} of={job.total} />
      <Text variant="small">{words.leave}</Text>
    </Box>
  );
}

function Refused({ job }: { job: MonthJob }) {
  if (job.refused.length === 0) return null;
  return (
    <Notice kind="error" title={words.refusedHead(job.refused.length)} live={false}>
      {job.refused.map(({ partner, why }) => (
        <Box key={partner.id} gap="xs">
          <Text>{`${partner.name}: ${why}`}</Text>
          <Link href={`/terms/${partner.id}`} label={words.seeTerms(partner.name)} />
        </Box>
      ))}
      <Text variant="small">{words.refusedHint}</Text>
    </Notice>
  );
}
