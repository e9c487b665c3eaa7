import { and, asc, eq, gt, inArray, or } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { terms } from '@/db/schema/companies';
import { containerTypes } from '@/db/schema/containers';
import { receiptLines, receipts } from '@/db/schema/work';
import { multiply, roundToMinor, sum } from '@/shared/domain/money';
import { type SiteWithCompany, sitesById } from '../partners/sites';

export type UnannouncedReceipt = {
  id: string;
  importId: string;
  reference: string | null;
  countedOn: string;
  from: { siteId: string; site: string; companyId: string; company: string };
  to: { siteId: string; site: string; companyId: string; company: string };
  /** The partner of the lane: the receiver where both are partners. */
  partnerId: string;
  partner: string;
  lines: { typeCode: string; units: number }[];
  units: number;
  /** Replacement value of what was counted, by the partner's terms on that day, in the partner's currency. */
  atStake: string;
  currency: string;
};

type Asked = { limit: number; /** "day id" of the last row seen. */ after?: string };

/** Receipts that no shipment was found for and nobody has booked, oldest first. */
export async function unannouncedReceipts(
  db: Reader,
  { limit, after }: Asked,
): Promise<{ rows: UnannouncedReceipt[]; next: string | null }> {
  const [day = '', id = ''] = after?.split(' ') ?? [];
  const heads = await db
    .select()
    .from(receipts)
    .where(
      and(
        eq(receipts.state, 'unannounced'),
        after === undefined
          ? undefined
          : or(gt(receipts.countedOn, day), and(eq(receipts.countedOn, day), gt(receipts.id, id))),
      ),
    )
    .orderBy(asc(receipts.countedOn), asc(receipts.id))
    .limit(limit + 1);
  const page = heads.slice(0, limit);
  const last = page.at(-1);
  return {
    rows: await described(db, page),
    next: heads.length > limit && last ? `${last.countedOn} ${last.id}` : null,
  };
}

async function described(
  db: Reader,
  heads: readonly (typeof receipts.$inferSelect)[],
): Promise<UnannouncedReceipt[]> {
  if (heads.length === 0) return [];
  const sites = await sitesById(
    db,
    heads.flatMap(({ fromSiteId, toSiteId }) => [fromSiteId, toSiteId]),
  );
  const lines = await db
    .select()
    .from(receiptLines)
    .where(
      inArray(
        receiptLines.receiptId,
        heads.map(({ id }) => id),
      ),
    );
  const worth = await worthByType(db, [...new Set(lines.map(({ typeCode }) => typeCode))]);
  return heads.flatMap((head) => {
    const from = sites.get(head.fromSiteId);
    const to = sites.get(head.toSiteId);
    if (!from || !to) return [];
    const partner = to.company.kind === 'partner' ? to.company : from.company;
    const own = lines.filter(({ receiptId }) => receiptId === head.id);
    const values = own.map(({ typeCode, counted }) =>
      multiply(worth({ companyId: partner.id, typeCode, day: head.countedOn }), String(counted)),
    );
    return [
      {
        id: head.id,
        importId: head.importId,
        reference: head.reference,
        countedOn: head.countedOn,
        from: endOf(from),
        to: endOf(to),
        partnerId: partner.id,
        partner: partner.name,
        lines: own.map(({ typeCode, counted }) => ({ typeCode, units: counted })),
        units: own.reduce((total, { counted }) => total + counted, 0),
        atStake: roundToMinor(sum(values), partner.currency),
        currency: partner.currency,
      },
    ];
  });
}

const endOf = (site: SiteWithCompany) => ({
  siteId: site.id,
  site: site.name,
  companyId: site.companyId,
  company: site.company.name,
});

/** Replacement value of one unit: by the terms in force, else by the container type. */
async function worthByType(db: Reader, typeCodes: readonly string[]) {
  const codes = typeCodes.length > 0 ? [...typeCodes] : [''];
  const versions = await db
    .select()
    .from(terms)
    .where(inArray(terms.typeCode, codes))
    .orderBy(asc(terms.validFrom));
  const types = await db
    .select({ code: containerTypes.code, replacement: containerTypes.replacement })
    .from(containerTypes)
    .where(inArray(containerTypes.code, codes));
  const ofType = new Map(types.map(({ code, replacement }) => [code, replacement]));
  return ({ companyId, typeCode, day }: { companyId: string; typeCode: string; day: string }): string => {
    const inForce = versions.findLast(
      (version) =>
        version.companyId === companyId && version.typeCode === typeCode && version.validFrom <= day,
    );
    return inForce?.replacement ?? ofType.get(typeCode) ?? '0';
  };
}
