import type { Transaction } from '@/db/client';
import type { sendingForm } from '@/shared/contracts/shipments';
import { addDays, compareDays, dayInZone } from '@/shared/domain/calendar';
import { type BadField, Problem } from '@/shared/problems/problems';
import type { z } from 'zod';
import type { Person } from '../../http/person';
import { queueMail } from '../../mail/outbox';
import { peopleWhoMay } from '../partners/people-who-may';
import { sitesById } from '../partners/sites';
import { contentsSentBy } from './contents-sent-by';
import { shipmentMail } from './letters';
import { sendShipment, type Sent } from './send-shipment';

type Form = z.output<typeof sendingForm>;
type SentByForm = { form: Form; person: Person; now: string; publicUrl: string };

/** Longest time back that a departure can be dated, and ahead that an arrival can be expected. */
const furthestDays = 366;

/** What a person sends through the form: from an own site, to the other side; the receivers are told by mail. */
export async function sendByForm(
  tx: Transaction,
  { form, person, now, publicUrl }: SentByForm,
): Promise<Sent & { contents: 'empties' | 'fulls' }> {
  const { reference, ...rest } = form;
  await refuseForeignSites(tx, { form, person, now });
  const contents = contentsSentBy(person.companyKind);
  const sent = await sendShipment(tx, {
    ...rest,
    ...(reference === undefined ? {} : { reference }),
    contents,
    origin: 'form',
    personId: person.id,
    now,
  });
  const letter = shipmentMail({
    reference: sent.reference,
    contents,
    from: sent.from.name,
    company: sent.from.company.name,
    to: sent.to.name,
    expectedOn: form.expectedOn,
    link: `${publicUrl}/shipments/${sent.id}/count`,
  });
  for (const to of await peopleWhoMay(tx, { companyId: sent.to.companyId, ability: 'count shipments' }))
    await queueMail(tx, { to, now, ...letter(to.name) });
  return { ...sent, contents };
}

async function refuseForeignSites(
  tx: Transaction,
  { form, person, now }: Pick<SentByForm, 'form' | 'person' | 'now'>,
): Promise<void> {
  const sites = await sitesById(tx, [form.fromSiteId, form.toSiteId]);
  const from = sites.get(form.fromSiteId);
  const to = sites.get(form.toSiteId);
  const fields: BadField[] = [];
  if (from?.companyId === person.companyId) fields.push(...badDays(form, dayInZone(now, from.timeZone)));
  else fields.push({ path: 'fromSiteId', message: 'Choose a site of your own company' });
  if (!to || to.company.kind === person.companyKind || !to.company.active)
    fields.push({ path: 'toSiteId', message: 'Choose a site from the list' });
  if (fields.length > 0) throw new Problem('not valid', { fields });
}

function badDays(form: Form, today: string): BadField[] {
  const fields: BadField[] = [];
  if (compareDays(form.leftOn, today) > 0)
    fields.push({ path: 'leftOn', message: 'A shipment is booked on the day it leaves, not before' });
  if (compareDays(form.leftOn, addDays(today, -furthestDays)) < 0)
    fields.push({ path: 'leftOn', message: 'More than a year ago' });
  if (compareDays(form.expectedOn, addDays(today, furthestDays)) > 0)
    fields.push({ path: 'expectedOn', message: 'More than a year ahead' });
  return fields;
}
