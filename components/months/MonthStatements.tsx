import { downloadMonth, draftStatements, issueStatements } from '@/shared/contracts/months';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { urlOf } from '../data/url-of';
import { usePost } from '../data/use-operation';
import { announce } from '../ui/Announcer';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { ButtonLink, DownloadLink } from '../ui/Link';
import { Text } from '../ui/Text';
import { MonthJobs } from './MonthJobs';
import type { MonthPage } from './MonthScreen';

const words = text.months;

/** The statements of a closed month: how far they are, looking through them, sending them out. */
export function MonthStatements({ page }: { page: MonthPage }) {
  const { month, statements } = page;
  const count = statements.drafts + statements.issued;
  return (
    <Card title={words.draftsHead} beside={<Text variant="soft">{words.counts(statements)}</Text>}>
      <MonthJobs page={page} />
      {page.mayIssue ? <IssueAll page={page} /> : null}
      {count > 0 ? (
        <Box row wrap gap="m">
          <ButtonLink
            href={`/statements?month=${month}`}
            label={words.seeStatements(count)}
            kind={page.mayIssue ? 'secondary' : 'primary'}
          />
          <DownloadLink href={urlOf(downloadMonth, { params: { month } })} label={words.downloadAll} />
        </Box>
      ) : null}
      {page.mayDraft && isUnfinished(page) ? <DraftAgain month={month} /> : null}
    </Card>
  );
}

/** While a draft waits or a partner could not be reckoned, what is known now may change them. */
const isUnfinished = ({ statements, jobs }: MonthPage) =>
  statements.drafts > 0 || jobs.some((job) => job.refused.length > 0);

function IssueAll({ page }: { page: MonthPage }) {
  const issue = usePost(issueStatements, { refreshes: ['statements'] });
  return (
    <Box gap="s" align="start">
      {issue.error ? <Problem error={issue.error} /> : null}
      <Button
        label={words.issueAll(page.statements.drafts)}
        busy={issue.isPending}
        onPress={() =>
          issue.mutate({ params: { month: page.month } }, { onSuccess: () => announce(words.issueDone) })
        }
      />
      <Text variant="small">{words.issueNote}</Text>
    </Box>
  );
}

function DraftAgain({ month }: { month: string }) {
  const again = usePost(draftStatements, { refreshes: ['statements'] });
  return (
    <Box gap="xs" align="start">
      {again.error ? <Problem error={again.error} /> : null}
      <Button
        kind="quiet"
        label={words.draftAgain}
        busy={again.isPending}
        onPress={() => again.mutate({ params: { month } })}
      />
      <Text variant="small">{words.draftAgainNote}</Text>
    </Box>
  );
}
