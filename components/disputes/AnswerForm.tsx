import { useState } from 'react';
import { useWatch } from 'react-hook-form';
import { answerDispute, answerSteps, type DisputeDetail } from '@/shared/contracts/disputes';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { ChoiceField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { SentFilesField } from '../forms/SentFilesField';
import { MoneyField, NumberField, TextAreaField } from '../forms/text-fields';
import { type DraftForm, useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Card } from '../ui/Card';
import { Notice } from '../ui/Notice';
import { answerDraft, withFileIds } from './dispute-draft';
import { effectOf } from './answer-effect';

const words = text.disputes.answer;

/** The operator's word: each decision says what it does before it is sent. */
export function AnswerForm({ dispute }: { dispute: DisputeDetail }) {
  const seenMessageId = dispute.messages.at(-1)?.id ?? '';
  const draft = useDraftForm({
    name: `answer ${dispute.id} ${seenMessageId}`,
    schema: answerDraft,
    defaultValues: { seenMessageId, text: '', files: [] },
  });
  const [unsent, setUnsent] = useState(false);
  const post = usePost(answerDispute, {
    refreshes: ['differences', 'shipments', 'balances', 'statements', 'today'],
  });
  return (
    <Card title={words.head} level={3}>
      <FormFrame
        draft={draft}
        label={words.head}
        submitLabel={words.send}
        disabled={unsent}
        onSubmit={async (values) => {
          await post.mutateAsync({ params: { dispute: dispute.id }, body: withFileIds(values) });
          announce(words.done);
        }}
      >
        <ChoiceField
          name="step"
          label={words.step}
          options={answerSteps
            .filter((value) => value !== 'accept in part' || isDivisible(dispute))
            .map((value) => ({ value, label: words.steps[value] }))}
        />
        <StepFields draft={draft} dispute={dispute} />
        <TextAreaField name="text" label={words.text} hint={words.textNeeded} />
        <SentFilesField onUnsent={setUnsent} name="files" label={words.paper} />
      </FormFrame>
    </Card>
  );
}

/** One unit cannot be accepted in part. */
const isDivisible = ({ claimed, stated }: DisputeDetail) =>
  claimed === stated || Math.abs(claimed - stated) > 1;

type StepProps = { draft: DraftForm<typeof answerDraft>; dispute: DisputeDetail };

function StepFields({ draft, dispute }: StepProps) {
  const { step, units, amount } = useWatch({ control: draft.form.control });
  if (step === undefined) return null;
  const { claimed, stated, amountClaimed, currency } = dispute;
  const inMoney = claimed === stated;
  return (
    <>
      {step === 'accept in part' && inMoney ? (
        <MoneyField
          name="amount"
          label={words.amount}
          currency={currency}
          hint={words.amountHelp(amountClaimed, currency)}
        />
      ) : null}
      {step === 'accept in part' && !inMoney ? (
        <NumberField
          name="units"
          label={words.units}
          hint={words.unitsHelp(Math.abs(claimed - stated))}
          least={1}
        />
      ) : null}
      <Notice>{effectOf(dispute, { step, units, amount })}</Notice>
    </>
  );
}
