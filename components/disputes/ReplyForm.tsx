import { useState } from 'react';
import { type DisputeDetail, replyToDispute, withdrawDispute } from '@/shared/contracts/disputes';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { usePost } from '../data/use-operation';
import { FormFrame } from '../forms/FormFrame';
import { SentFilesField } from '../forms/SentFilesField';
import { TextAreaField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Box } from '../ui/Box';
import { Button } from '../ui/Button';
import { Card } from '../ui/Card';
import { Dialog } from '../ui/Dialog';
import { Text } from '../ui/Text';
import { replyDraft, withFileIds } from './dispute-draft';

const words = text.disputes.reply;
const refreshes = ['statements', 'shipments', 'differences', 'today'];

/** The partner's further word, or the end of it. */
export function ReplyForm({ dispute }: { dispute: DisputeDetail }) {
  const draft = useDraftForm({
    name: `reply ${dispute.id}`,
    schema: replyDraft,
    defaultValues: { text: '', files: [] },
  });
  const [unsent, setUnsent] = useState(false);
  const post = usePost(replyToDispute, { refreshes });
  return (
    <Card title={words.head} level={3}>
      <FormFrame
        draft={draft}
        label={words.head}
        submitLabel={words.send}
        disabled={unsent}
        more={<Withdraw dispute={dispute} />}
        onSubmit={async (values) => {
          await post.mutateAsync({ params: { dispute: dispute.id }, body: withFileIds(values) });
          announce(words.done);
        }}
      >
        <TextAreaField name="text" label={words.text} />
        <SentFilesField onUnsent={setUnsent} name="files" label={text.disputes.answer.paper} />
      </FormFrame>
    </Card>
  );
}

function Withdraw({ dispute }: { dispute: DisputeDetail }) {
  const [asks, setAsks] = useState(false);
  const post = usePost(withdrawDispute, { refreshes });
  const withdraw = () =>
    post.mutate(
      { params: { dispute: dispute.id }, body: {} },
      {
        onSuccess: () => {
          setAsks(false);
          announce(words.withdrawn);
        },
      },
    );
  return (
    <>
      <Button kind="quiet" label={words.withdraw} onPress={() => setAsks(true)} />
      <Dialog open={asks} title={words.withdrawHead} onClose={() => setAsks(false)}>
        <Text>{words.withdrawBody}</Text>
        {post.error ? <Problem error={post.error} /> : null}
        <Box row wrap gap="m">
          <Button label={words.withdraw} busy={post.isPending} onPress={withdraw} />
          <Button kind="secondary" label={words.keep} onPress={() => setAsks(false)} />
        </Box>
      </Dialog>
    </>
  );
}
