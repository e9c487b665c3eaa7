import { router } from 'expo-router';
import { approvalForm, approvePool, readPool } from '@/shared/contracts/pool';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { usePost, useRead } from '../data/use-operation';
import { FormFrame } from '../forms/FormFrame';
import { NumberField, TextAreaField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Card } from '../ui/Card';
import { ButtonLink } from '../ui/Link';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';
import { LevelFields } from './LevelFields';
import type { Pool } from './pool-answer';

const words = text.pool;

export function ApproveScreen({ type }: { type: string }) {
  const { data, error, refetch } = useRead(readPool, { params: { type } });
  const size = data?.reckoned?.result.poolSize;
  if (data && size !== undefined) return <ApproveForm key={size} pool={data} reckoned={size} />;
  return (
    <Page title={words.approveTitle} back={{ href: `/pool/${type}`, label: words.title }}>
      {error ? <Problem error={error} onRetry={() => void refetch()} /> : null}
      {data ? <Text>{words.whyNot[data.whyNot ?? 'refused'].hint}</Text> : null}
      {!error && !data ? <Skeleton lines={6} tall /> : null}
    </Page>
  );
}

function ApproveForm({ pool, reckoned }: { pool: Pool; reckoned: number }) {
  const { code, name } = pool.type;
  const href = `/pool/${code}`;
  const draft = useDraftForm({
    name: `approve ${code} ${reckoned}`,
    schema: approvalForm,
    defaultValues: {
      size: reckoned,
      reckoned,
      note: '',
      levels: pool.sites.flatMap(({ id, minimum, maximum }) =>
        minimum === null || maximum === null ? [] : [{ siteId: id, minimum, maximum }],
      ),
    },
  });
  const post = usePost(approvePool, { refreshes: ['today'] });
  return (
    <Page title={words.approveTitle} back={{ href, label: name }} narrow>
      <Text variant="soft">{words.approveLead(reckoned, pool.inPool)}</Text>
      <FormFrame
        draft={draft}
        label={words.approveTitle}
        submitLabel={words.approveNow}
        inBar
        more={<ButtonLink href={href} label={text.ui.cancel} kind="secondary" />}
        onSubmit={async (body) => {
          await post.mutateAsync({ params: { type: code }, body });
          announce(words.approvedNow(body.size));
          router.replace(href);
        }}
      >
        <Card>
          <NumberField
            name="size"
            label={words.approveForm.size}
            hint={words.approveForm.sizeHint}
            least={1}
          />
          <TextAreaField name="note" label={words.approveForm.note} optional rows={2} />
        </Card>
        <LevelFields control={draft.form.control} sites={pool.sites} />
      </FormFrame>
    </Page>
  );
}
