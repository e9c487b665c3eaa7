import type { LineSubject } from '@/shared/contracts/disputes';
import { text } from '@/shared/text/catalogue';
import { useField } from '../forms/use-field';
import { Select } from '../ui/Select';

const words = text.disputes.form;

/** The shipment on which the units came back; none is an answer too. */
export function ShipmentField({ shipments }: { shipments: LineSubject['shipments'] }) {
  const { value, onChange, ...field } = useField<string | undefined>('shipmentId', words.shipment);
  return (
    <Select
      {...field}
      value={value ?? ''}
      onChange={(next) => onChange(next === '' ? undefined : next)}
      placeholder={words.shipmentNone}
      options={shipments.map(({ id, reference, leftOn }) => ({
        value: id,
        label: words.shipmentOption(reference, leftOn),
      }))}
    />
  );
}
