import { listPartChoices } from '@/shared/contracts/parts';
import { text } from '@/shared/text/catalogue';
import { useRead } from '../data/use-operation';
import { SelectField } from '../forms/choice-fields';
import { MoneyField, NumberField, TextField } from '../forms/text-fields';
import { Card } from '../ui/Card';

const words = text.parts.form;

type Named = { id: string; name: string; company?: string };
type Chosen = { type: { code: string; name: string }; supplierSite: Named; plantSite: Named };

const siteOptions = (sites: readonly Named[]) =>
  sites.map(({ id, name, company }) => ({ value: id, label: words.site(name, company ?? name) }));

/** What is offered, and what was chosen before even if it is out of use by now. */
function withChosen<One>(
  offered: readonly One[],
  chosen: One | undefined,
  same: (one: One) => unknown,
): One[] {
  if (chosen === undefined || offered.some((one) => same(one) === same(chosen))) return [...offered];
  return [...offered, chosen];
}

/** The fields of a part, the same for a new one and a changed one. */
export function PartFields({ chosen }: { chosen?: Chosen }) {
  const { data } = useRead(listPartChoices);
  const types = withChosen(data?.types ?? [], chosen?.type, (one) => one.code);
  const suppliers: Named[] = data?.supplierSites ?? [];
  const plants: Named[] = data?.plantSites ?? [];
  return (
    <Card>
      <TextField name="number" label={words.number} />
      <TextField name="name" label={words.name} />
      <SelectField
        name="typeCode"
        label={words.type}
        options={types.map(({ code, name }) => ({ value: code, label: name }))}
      />
      <SelectField
        name="supplierSiteId"
        label={words.supplier}
        options={siteOptions(withChosen(suppliers, chosen?.supplierSite, (one) => one.id))}
      />
      <SelectField
        name="plantSiteId"
        label={words.plant}
        options={siteOptions(withChosen(plants, chosen?.plantSite, (one) => one.id))}
      />
      <NumberField name="unitsPerContainer" label={words.unitsPerContainer} least={1} />
      <MoneyField name="unitsPerDayMean" label={words.mean} />
      <MoneyField name="unitsPerDaySd" label={words.sd} hint={words.sdHint} />
    </Card>
  );
}
