import { eq, or, type SQL } from 'drizzle-orm';
import { fromCompany, fromSite, toCompany, toSite } from '../shipments/shipment-rows';

export const laneColumns = {
  fromSite: fromSite.name,
  toSite: toSite.name,
  fromCompanyId: fromCompany.id,
  fromCompany: fromCompany.name,
  fromKind: fromCompany.kind,
  fromCurrency: fromCompany.currency,
  toCompanyId: toCompany.id,
  toCompany: toCompany.name,
  toKind: toCompany.kind,
  toCurrency: toCompany.currency,
};

export type Lane = {
  fromSite: string;
  toSite: string;
  fromCompanyId: string;
  fromCompany: string;
  fromCurrency: string;
  toCompanyId: string;
  toCompany: string;
  toKind: 'operator' | 'partner';
  toCurrency: string;
};

export function endsOf(lane: Lane) {
  return {
    from: { companyId: lane.fromCompanyId, company: lane.fromCompany, site: lane.fromSite },
    to: { companyId: lane.toCompanyId, company: lane.toCompany, site: lane.toSite },
  };
}

/** The partner of a lane: the side that is not the operator; the receiver where both are partners. */
export function partnerOf(lane: Lane): { companyId: string; currency: string } {
  return lane.toKind === 'partner'
    ? { companyId: lane.toCompanyId, currency: lane.toCurrency }
    : { companyId: lane.fromCompanyId, currency: lane.fromCurrency };
}

export function onLaneOf(partner: string | undefined): SQL | undefined {
  return partner ? or(eq(fromCompany.id, partner), eq(toCompany.id, partner)) : undefined;
}
