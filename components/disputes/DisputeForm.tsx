import { router } from 'expo-router';
import { type ReactNode, useState } from 'react';
import { disputeReasons, openDispute } from '@/shared/contracts/disputes';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { SelectField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { SentFilesField } from '../forms/SentFilesField';
import { TextAreaField } from '../forms/text-fields';
import type { DraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { type openingDraft, withFileIds } from './dispute-draft';

const words = text.disputes.form;

type Props = {
  draft: DraftForm<typeof openingDraft>;
  label: string;
  /** What is disputed, and by how much. */
  claim: ReactNode;
  /** After the reason: the shipment it is about. */
  more?: ReactNode;
};

/** The form of every dispute: the claim, why, what happened, the paper. */
export function DisputeForm({ draft, label, claim, more }: Props) {
  const [unsent, setUnsent] = useState(false);
  const post = usePost(openDispute, { refreshes: ['shipments', 'statements', 'differences', 'today'] });
  return (
    <FormFrame
      draft={draft}
      label={label}
      submitLabel={words.send}
      inBar
      disabled={unsent}
      onSubmit={async (values) => {
        const { id } = await post.mutateAsync({ body: withFileIds(values) });
        announce(words.done);
        router.replace(`/disputes/${id}`);
      }}
    >
      {claim}
      <SelectField
        name="reason"
        label={words.why}
        placeholder={words.whyNone}
        options={disputeReasons.map((value) => ({ value, label: text.disputes.reasons[value] }))}
      />
      {more}
      <TextAreaField name="text" label={words.what} />
      <SentFilesField onUnsent={setUnsent} name="files" label={words.paper} hint={words.paperHelp} />
    </FormFrame>
  );
}
