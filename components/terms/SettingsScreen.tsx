import { router } from 'expo-router';
import { partnerTerms, readPartnerTerms, setPartnerTerms } from '@/shared/contracts/terms';
import { currencyCodes } from '@/shared/domain/currencies';
import { text } from '@/shared/text/catalogue';
import { Problem } from '../data/Problem';
import { usePost, useRead } from '../data/use-operation';
import { ChoiceField, SelectField } from '../forms/choice-fields';
import { FormFrame } from '../forms/FormFrame';
import { MoneyField, NumberField } from '../forms/text-fields';
import { useDraftForm } from '../forms/use-draft-form';
import { announce } from '../ui/Announcer';
import { Card } from '../ui/Card';
import { Notice } from '../ui/Notice';
import { Page } from '../ui/Page';
import { Skeleton } from '../ui/Skeleton';
import { Text } from '../ui/Text';
import type { PartnerTermsPage } from './PartnerTermsScreen';

const words = text.terms;
const { field } = words;

/** Currency, tax, days and tolerance of a partner. */
export function SettingsScreen({ partner }: { partner: string }) {
  const { data, error, refetch } = useRead(readPartnerTerms, { params: { partner } });
  const back = { href: `/terms/${partner}`, label: data ? words.partnerHead(data.partner.name) : words.head };
  return (
    <Page title={data ? words.settingsForm(data.partner.name) : words.head} back={back} narrow>
      {data ? (
        <SettingsForm page={data} />
      ) : error ? (
        <Problem error={error} onRetry={() => void refetch()} />
      ) : (
        <Skeleton lines={8} tall />
      )}
    </Page>
  );
}

function SettingsForm({ page }: { page: PartnerTermsPage }) {
  const { partner, settings } = page;
  const set = usePost(setPartnerTerms, { refreshes: ['partners'] });
  const draft = useDraftForm({
    schema: partnerTerms,
    name: `settings ${partner.id}`,
    defaultValues: settings,
  });
  return (
    <Card>
      <FormFrame
        draft={draft}
        label={words.settingsForm(partner.name)}
        submitLabel={words.saveSettings}
        inBar
        onSubmit={async (body) => {
          await set.mutateAsync({ params: { partner: partner.id }, body });
          announce(words.savedSettings);
          router.replace(`/terms/${partner.id}`);
        }}
      >
        <Fields page={page} />
      </FormFrame>
    </Card>
  );
}

function Fields({ page }: { page: PartnerTermsPage }) {
  return (
    <>
      <SelectField
        name="currency"
        label={field.currency}
        options={currencyCodes.map((code) => ({ value: code, label: code }))}
        disabled={page.currencyFixed}
        {...(page.currencyFixed ? { hint: words.hint.currencyFixed } : {})}
      />
      <MoneyField name="taxRate" label={field.taxRate} />
      <ChoiceField
        name="taxTreatment"
        label={field.taxTreatment}
        hint={words.treatmentSource}
        options={(['excluded', 'included'] as const).map((value) => ({
          value,
          label: words.treatment[value],
        }))}
      />
      <Notice kind="caution" live={false}>
        <Text>{words.caution}</Text>
      </Notice>
      <NumberField name="objectionDays" label={field.objectionDays} />
      <NumberField name="autoCountDays" label={field.autoCountDays} />
      <NumberField name="toleranceUnits" label={field.toleranceUnits} />
      <MoneyField name="tolerancePct" label={field.tolerancePct} />
    </>
  );
}
