import { listApprovals, type PoolApproval } from '@/shared/contracts/pool';
import { text } from '@/shared/text/catalogue';
import { dayInZone } from '@/shared/domain/calendar';
import { useReadPages } from '../data/use-operation';
import { useSignedIn } from '../data/use-session';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card, Rule } from '../ui/Card';
import { Disclosure } from '../ui/Disclosure';
import { Figure } from '../ui/Figure';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';

const words = text.pool;

/** Every size that was approved, newest first, with what it was reckoned from. */
export function ApprovalsCard({ type }: { type: string }) {
  const list = useReadPages(listApprovals, { params: { type }, query: { limit: '5' } });
  const rows = (list.data?.pages.flatMap((page) => page.rows) ?? []) as PoolApproval[];
  return (
    <Card title={words.approvals}>
      {list.isPending ? <Skeleton lines={2} /> : null}
      {!list.isPending && rows.length === 0 ? <Text variant="soft">{words.approvalsNone}</Text> : null}
      {rows.map((approval, at) => (
        <Box key={approval.id} gap="s">
          {at > 0 ? <Rule /> : null}
          <Approval approval={approval} />
        </Box>
      ))}
      {list.hasNextPage ? (
        <Button
          kind="secondary"
          label={text.ui.showMore}
          busy={list.isFetchingNextPage}
          onPress={() => void list.fetchNextPage()}
        />
      ) : null}
    </Card>
  );
}

function Approval({ approval }: { approval: PoolApproval }) {
  const { company } = useSignedIn();
  const { size, by, at, note, result, levels } = approval;
  return (
    <>
      <Box row wrap spread="between" gap="m">
        <Figure units={size} size="title" />
        <Text variant="soft">{words.approvalNeeded(result.poolSize)}</Text>
      </Box>
      <Text>{words.approvalLine(by, dayInZone(at, company.timeZone))}</Text>
      {note === '' ? null : <Text>{note}</Text>}
      <Disclosure label={words.approvalFrom}>
        <Box gap="xs">
          <Text variant="soft">{words.approvalFacts(result)}</Text>
          {levels.map(({ site, minimum, maximum }) => (
            <Text key={site.id} variant="soft">
              {words.levelLine(text.parts.form.site(site.name, site.company), { minimum, maximum })}
            </Text>
          ))}
        </Box>
      </Disclosure>
    </>
  );
}
