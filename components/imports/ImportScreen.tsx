import { readImport, type ImportDetail } from '@/shared/contracts/imports';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { useRead } from '../data/use-operation';
import { Card } from '../ui/Card';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Tag } from '../ui/Tag';
import { BrokenBody } from './BrokenBody';
import { stateTones } from './import-columns';
import { PreviewBody } from './PreviewBody';
import { ProgressBody } from './ProgressBody';
import { ResultBody } from './ResultBody';

const words = text.imports;
const back = { href: '/imports', label: words.list.head };

/** One file at whatever stage it is: preview, posting, result. */
export function ImportScreen({ id }: { id: string }) {
  const detail = useRead(readImport, { params: { import: id } });
  const held = detail.data as ImportDetail | undefined;
  if (held?.state === 'preview') return <PreviewBody held={held} back={back} />;
  return (
    <Page
      title={held?.fileName ?? words.list.head}
      back={back}
      narrow
      beside={held ? <Tag tone={stateTones[held.state]} label={words.states[held.state]} /> : null}
    >
      {detail.error ? <Problem error={detail.error} onRetry={() => void detail.refetch()} /> : null}
      {held === undefined && !detail.error ? (
        <Card>
          <Skeleton lines={6} />
        </Card>
      ) : null}
      {held?.state === 'running' ? <ProgressBody id={id} /> : null}
      {held?.state === 'failed' ? <BrokenBody held={held} /> : null}
      {held?.state === 'dropped' ? <Notice live={false}>{words.dropped}</Notice> : null}
      {held?.state === 'done' ? <ResultBody held={held} /> : null}
    </Page>
  );
}
