import { confirmStatement, downloadStatement, issueStatement } from '@/shared/contracts/statements';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { urlOf } from '../data/url-of';
import { usePost } from '../data/use-operation';
import { useIsWide } from '../theme/use-breakpoint';
import { announce } from '../ui/Announcer';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { DownloadLink } from '../ui/Link';
import { NotPrinted } from '../ui/NotPrinted';
import { Text } from '../ui/Text';
import type { StatementPage } from './StatementScreen';

const words = text.statements.page;

/** The spreadsheet and paper; from 900 px on with the main action above them, which a phone has in its bar. */
export function StatementActions({ page }: { page: StatementPage }) {
  const wide = useIsWide();
  const params = { statement: page.id };
  const acts = page.mayIssue || page.mayConfirm;
  return (
    <NotPrinted>
      <Box gap="m" align="stretch">
        {wide ? <MainAction page={page} /> : null}
        <DownloadLink
          href={urlOf(downloadStatement, { params })}
          label={words.download}
          kind={acts ? 'secondary' : 'primary'}
          full
        />
        <Button kind="secondary" label={words.print} full onPress={() => window.print()} />
      </Box>
    </NotPrinted>
  );
}

/** The one thing that this person can do with the statement now. */
export function MainAction({ page }: { page: StatementPage }) {
  if (page.mayIssue) return <Issue statement={page.id} />;
  return page.mayConfirm ? <Confirm statement={page.id} /> : null;
}

function Issue({ statement }: { statement: string }) {
  const issue = usePost(issueStatement, { refreshes: ['months'] });
  return (
    <Box gap="s" align="stretch">
      {issue.error ? <Problem error={issue.error} /> : null}
      <Button
        label={words.issue}
        full
        busy={issue.isPending || issue.isSuccess}
        onPress={() =>
          issue.mutate({ params: { statement } }, { onSuccess: () => announce(words.issueDone) })
        }
      />
      <Text variant="small">{words.issueNote}</Text>
    </Box>
  );
}

function Confirm({ statement }: { statement: string }) {
  const confirm = usePost(confirmStatement);
  return (
    <Box gap="s" align="stretch">
      {confirm.error ? <Problem error={confirm.error} /> : null}
      <Button
        label={words.confirm}
        full
        busy={confirm.isPending || confirm.isSuccess}
        onPress={() =>
          confirm.mutate({ params: { statement } }, { onSuccess: () => announce(words.confirmDone) })
        }
      />
      <Text variant="small">{words.confirmNote}</Text>
    </Box>
  );
}
