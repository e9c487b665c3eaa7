import { text } from '@/shared/text/catalogue';
import { DateField, SelectField } from '../forms/choice-fields';
import { MoneyField, NumberField } from '../forms/text-fields';
import { Box } from '../ui/Box';
import type { PartnerTermsPage } from './PartnerTermsScreen';

const { field, hint } = text.terms;
type Props = { page: PartnerTermsPage; type: string | undefined; first: string | undefined };

export function TermsFields({ page, type, first }: Props) {
  const { currency } = page.settings;
  const types = [...page.types.map((each) => each.type), ...page.otherTypes];
  const fee = { currency, hint: hint.fees };
  return (
    <Box gap="l">
      <SelectField
        name="typeCode"
        label={field.typeCode}
        options={types.map(({ code, name }) => ({ value: code, label: name }))}
        disabled={type !== undefined && types.some(({ code }) => code === type)}
      />
      <DateField
        name="validFrom"
        label={field.validFrom}
        hint={hint.validFrom(first ? page.closedThrough : null)}
      />
      <MoneyField name="deposit" label={field.deposit} currency={currency} />
      <MoneyField name="replacement" label={field.replacement} currency={currency} />
      <NumberField name="freeDays" label={field.freeDays} />
      <MoneyField name="dailyFee" label={field.dailyFee} {...fee} />
      <NumberField name="lostAfterDays" label={field.lostAfterDays} hint={hint.lostAfterDays} optional />
      <NumberField name="usefulLifeMonths" label={field.usefulLifeMonths} />
      <MoneyField name="residualFloorPct" label={field.residualFloorPct} />
      <MoneyField name="damageFee" label={field.damageFee} {...fee} />
      <MoneyField name="cleaningFee" label={field.cleaningFee} {...fee} />
      <NumberField name="recoveryDays" label={field.recoveryDays} hint={hint.recoveryDays} />
    </Box>
  );
}
