import { useWatch } from 'react-hook-form';
import {
  type ChosenWay,
  type DifferenceDetail,
  settleDifference,
  settlingForm,
} from '@/shared/contracts/differences';
import { text } from '@/shared/text/catalogue';
import { usePost } from '../data/use-operation';
import { ChoiceField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { NumberField, TextAreaField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Card } from '../ui/Card';
import { Notice } from '../ui/Notice';

const words = text.differences.settle;

/** The ways that fit, each with what it does to the book and to money before it is sent. */
export function SettleForm({ difference }: { difference: DifferenceDetail }) {
  const open = Math.abs(difference.openUnits);
  const draft = useDraftForm({
    name: `settle ${difference.id}`,
    schema: settlingForm,
    defaultValues: { units: open, reason: '' },
  });
  const post = usePost(settleDifference, { refreshes: ['shipments', 'balances', 'today', 'disputes'] });
  return (
    <Card title={words.head} level={3}>
      <FormFrame
        draft={draft}
        label={words.head}
        submitLabel={words.send}
        onSubmit={async (body) => {
          const done = await post.mutateAsync({ params: { difference: difference.id }, body });
          announce(words.done(done.units, done.way, Math.abs(done.openUnits)));
        }}
      >
        <ChoiceField
          name="way"
          label={words.way}
          below
          options={difference.choices.map((value) => ({ value, label: text.differences.ways[value] }))}
        />
        <WayFields draft={draft} difference={difference} />
        <NumberField name="units" label={words.units} hint={words.unitsHint(open)} least={1} />
        <TextAreaField name="reason" label={words.reason} hint={words.reasonHint} />
      </FormFrame>
    </Card>
  );
}

type WayProps = {
  draft: ReturnType<typeof useDraftForm<typeof settlingForm>>;
  difference: DifferenceDetail;
};

function WayFields({ draft, difference }: WayProps) {
  const typed = useWatch({ control: draft.form.control });
  const way = typed.way as ChosenWay | undefined;
  if (way === undefined) return null;
  const units =
    typeof typed.units === 'number' && typed.units > 0 ? typed.units : Math.abs(difference.openUnits);
  return (
    <>
      {way === 'lost on the way' ? (
        <ChoiceField
          name="bearerCompanyId"
          label={words.bearer}
          below
          options={difference.bearers.map(({ companyId, company, side }) => ({
            value: companyId,
            label: words.bearers[side](company),
          }))}
        />
      ) : null}
      {way === 'wrong type' ? (
        <ChoiceField
          name="swapWithId"
          label={words.swap}
          below
          options={difference.swaps.map(({ id, typeName, openUnits }) => ({
            value: id,
            label: words.swapOption(typeName, openUnits),
          }))}
        />
      ) : null}
      <Notice title={words.does}>
        {words.effect(
          way,
          effectOf(difference, { units, bearer: typed.bearerCompanyId, swap: typed.swapWithId }),
        )}
      </Notice>
    </>
  );
}

type Chosen = { units: number; bearer: string | undefined; swap: string | undefined };

function effectOf(difference: DifferenceDetail, { units, bearer, swap }: Chosen) {
  const bears = difference.bearers.find((each) => each.companyId === bearer);
  const other = difference.swaps.find((each) => each.id === swap);
  return {
    units,
    fewer: difference.openUnits < 0,
    sender: difference.from.company,
    receiver: difference.to.company,
    countedOn: difference.count.countedOn,
    ...(bears ? { bearer: bears.company, bearerIsPartner: bears.kind === 'partner' } : {}),
    ...(other ? { other: other.typeName } : {}),
  };
}
