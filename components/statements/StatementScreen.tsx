import { useEffect } from 'react';
import { openStatement, readStatement } from '@/shared/contracts/statements';
import type { AnswerOf } from '@/shared/contracts/operation';
import { text } from '@/shared/text/catalogue';
import { formatMonth } from '@/shared/text/format';
import { Problem } from '../data/Problem';
import { usePost, useRead } from '../data/use-operation';
import { useIsWide } from '../theme/use-breakpoint';
import { Card } from '../ui/Card';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';
import { AnswerPanel } from './AnswerPanel';
import { ContainersSheet } from './ContainersSheet';
import { DueNow } from './DueNow';
import { MoneySheet } from './MoneySheet';
import { MainAction, StatementActions } from './StatementActions';
import { StillOpen } from './StillOpen';
import { TaxSheet } from './TaxSheet';

const words = text.statements.page;
export type StatementPage = AnswerOf<typeof readStatement>;

/** One statement as on good stationery, and beside it what may be done and what became of it. */
export function StatementScreen({ statement }: { statement: string }) {
  const { data, error, refetch } = useRead(readStatement, { params: { statement } });
  useOpening(data);
  const wide = useIsWide();
  const acts = data?.mayIssue || data?.mayConfirm;
  const back = { href: '/statements', label: text.statements.head };
  if (!data) {
    return (
      <Page title={text.statements.head} back={back}>
        {error ? <Problem error={error} onRetry={() => void refetch()} /> : <Loading />}
      </Page>
    );
  }
  return (
    <Page
      title={formatMonth(data.month)}
      kicker={words.kicker(data.number, data.partner.name)}
      back={back}
      beside={<DueNow page={data} />}
      {...(!wide && acts ? { action: <MainAction page={data} /> } : {})}
      aside={
        <>
          <StatementActions page={data} />
          <AnswerPanel page={data} />
          <StillOpen page={data} />
        </>
      }
    >
      <Card gap="xl">
        <ContainersSheet page={data} />
        <MoneySheet page={data} />
        <TaxSheet page={data} />
        <Text variant="small">{words.fingerprint(data.sha256)}</Text>
      </Card>
    </Page>
  );
}

/** The first time that someone of the partner opens it is a step in its history. */
function useOpening(page: StatementPage | undefined) {
  const { mutate } = usePost(openStatement);
  const id = page?.firstOpening ? page.id : undefined;
  useEffect(() => {
    if (id !== undefined) mutate({ params: { statement: id } });
  }, [id, mutate]);
}

function Loading() {
  return (
    <Card>
      <Skeleton lines={10} tall />
    </Card>
  );
}
