import { formatDay } from '@/shared/text/format';
import { shipments as words } from '@/shared/text/en/shipments';
import { letterOf } from '../../mail/letters';
import type { Letter } from '../../mail/outbox';

type Announced = {
  reference: string;
  contents: 'empties' | 'fulls';
  from: string;
  company: string;
  to: string;
  expectedOn: string;
  link: string;
};

/** Tells a receiver that a shipment is on its way, with the link to count it. */
export function shipmentMail(shipment: Announced): (name: string) => Letter {
  const due = formatDay(shipment.expectedOn, 'weekday');
  return (name) =>
    letterOf('shipment sent', words.mail.sentSubject(shipment), {
      name,
      parts: [words.mail.sentText({ ...shipment, due }), shipment.link],
    });
}

type Uncounted = {
  reference: string;
  from: string;
  to: string;
  toCompany: string;
  expectedOn: string;
  on: string;
  link: string;
};

/** The day before empties are taken as counted as declared (RULES 2), to both sides. */
export function beforeAutomaticMail(shipment: Uncounted): (name: string) => Letter {
  const due = formatDay(shipment.expectedOn, 'weekday');
  const on = formatDay(shipment.on, 'weekday');
  return (name) =>
    letterOf('count due', words.mail.beforeSubject(shipment.reference), {
      name,
      parts: [words.mail.beforeText({ ...shipment, due, on }), shipment.link],
    });
}

/** After they were, to both sides. */
export function afterAutomaticMail(shipment: Uncounted): (name: string) => Letter {
  const due = formatDay(shipment.expectedOn, 'weekday');
  return (name) =>
    letterOf('counted automatically', words.mail.afterSubject(shipment.reference), {
      name,
      parts: [words.mail.afterText({ ...shipment, due }), shipment.link],
    });
}
