import { text } from '@/shared/text/catalogue';
import { Card } from '../ui/Card';
import { Link } from '../ui/Link';
import { Notice } from '../ui/Notice';
import { Sheet } from '../ui/Sheet';
import { Text } from '../ui/Text';
import type { PartnerTermsPage } from './PartnerTermsScreen';

const words = text.terms;
type Row = { key: string; label: string; value: string };

/** Currency, tax, days and tolerance, with the caution that an adviser decides on tax. */
export function SettingsCard({ page }: { page: PartnerTermsPage }) {
  const { settings, partner, maySet } = page;
  const rows: Row[] = [
    { key: 'currency', label: words.field.currency, value: settings.currency },
    { key: 'taxRate', label: words.tax, value: words.taxAt(settings.taxRate) },
    { key: 'taxTreatment', label: words.field.taxTreatment, value: words.treatment[settings.taxTreatment] },
    { key: 'objectionDays', label: words.field.objectionDays, value: words.days(settings.objectionDays) },
    { key: 'autoCountDays', label: words.field.autoCountDays, value: words.days(settings.autoCountDays) },
    {
      key: 'tolerance',
      label: words.field.toleranceUnits,
      value: words.toleranceOf(settings.toleranceUnits, settings.tolerancePct),
    },
  ];
  return (
    <Card
      title={words.settingsHead}
      {...(maySet ? { beside: <Link href={`/terms/${partner.id}/settings`} label={words.change} /> } : {})}
    >
      <Sheet<Row>
        caption={words.settingsHead}
        hideCaption
        rows={rows}
        rowKey={(row) => row.key}
        columns={[
          {
            key: 'what',
            head: words.settingHeads.what,
            cell: (row) => <Text variant="soft">{row.label}</Text>,
          },
          { key: 'value', head: words.settingHeads.value, cell: (row) => <Text>{row.value}</Text> },
        ]}
      />
      <Notice kind="caution" live={false}>
        {words.caution}
      </Notice>
    </Card>
  );
}
