import { and, eq } from 'drizzle-orm';
import type { z } from 'zod';
import type { Transaction } from '@/db/client';
import { containerTypes } from '@/db/schema/containers';
import { balances } from '@/db/schema/ledger';
import type { AdjustmentKind, adjustmentForm } from '@/shared/contracts/balances';
import { compareDays, dayInZone } from '@/shared/domain/calendar';
import { type BadField, Problem } from '@/shared/problems/problems';
import { outsideAccount, siteAccount } from '../ledger/accounts';
import { postEntry } from '../ledger/post-entry';
import { refuseWhatCannotBe } from '../ledger/reckonable';
import { recordEvents } from '../ledger/record-events';
import { type SiteWithCompany, sitesById } from '../partners/sites';

type Form = z.output<typeof adjustmentForm>;
export type Adjusting = Form & { personId: string | null; now: string };

const leaves: readonly AdjustmentKind[] = ['scrapped', 'lost'];
/** What only the owner of the pool does: at a partner's site units are found or lost, or were there from the start. */
const ownSitesOnly: readonly AdjustmentKind[] = ['bought', 'scrapped'];

/**
 * Units come in from outside the loop or go out of it, at a site (RULES 1). What a partner lost or found becomes part of
 * its assessment; what the rules refuse there (RULES 3.14) is not kept.
 */
export async function adjustStock(tx: Transaction, adjusting: Adjusting): Promise<{ entryId: number }> {
  const site = await checkedSite(tx, adjusting);
  const account = await siteAccount(tx, site);
  const outside = await outsideAccount(tx, adjusting.kind);
  const isLeaving = leaves.includes(adjusting.kind);
  if (isLeaving) await refuseMoreThanThere(tx, { account, adjusting });
  const isPartners = site.company.kind === 'partner';
  const entryId = await postEntry(tx, {
    kind: adjusting.kind,
    valueDate: adjusting.on,
    moves: [
      {
        typeCode: adjusting.typeCode,
        units: adjusting.units,
        from: isLeaving ? account : outside,
        to: isLeaving ? outside : account,
        ...(adjusting.kind === 'lost' ? { chargedCompanyId: site.companyId } : {}),
      },
    ],
    reason: adjusting.reason,
    personId: adjusting.personId,
  });
  if (isPartners && (adjusting.kind === 'lost' || adjusting.kind === 'found')) {
    await recordEvents(tx, [
      {
        companyId: site.companyId,
        date: adjusting.on,
        typeCode: adjusting.typeCode,
        kind: adjusting.kind,
        quantity: adjusting.units,
        entryId,
        cause: `${adjusting.kind} at ${site.name}`,
      },
    ]);
    await refuseWhatCannotBe(tx, {
      companyIds: [site.companyId],
      today: dayInZone(adjusting.now, site.timeZone),
    });
  }
  return { entryId };
}

async function checkedSite(tx: Transaction, adjusting: Adjusting): Promise<SiteWithCompany> {
  const site = (await sitesById(tx, [adjusting.siteId])).get(adjusting.siteId);
  const [type] = await tx
    .select({ code: containerTypes.code })
    .from(containerTypes)
    .where(eq(containerTypes.code, adjusting.typeCode));
  const fields: BadField[] = [];
  if (!site?.active) fields.push({ path: 'siteId', message: 'No such site' });
  if (!type) fields.push({ path: 'typeCode', message: `No container type ${adjusting.typeCode}` });
  if (site?.company.kind === 'partner' && ownSitesOnly.includes(adjusting.kind))
    fields.push({ path: 'siteId', message: 'Buying and scrapping are booked at the operator’s own sites' });
  if (site && compareDays(adjusting.on, dayInZone(adjusting.now, site.timeZone)) > 0)
    fields.push({ path: 'on', message: 'A day to come' });
  if (fields.length > 0 || !site) throw new Problem('not valid', { fields });
  return site;
}

async function refuseMoreThanThere(
  tx: Transaction,
  { account, adjusting }: { account: number; adjusting: Adjusting },
): Promise<void> {
  const [held] = await tx
    .select({ units: balances.units })
    .from(balances)
    .where(and(eq(balances.accountId, account), eq(balances.typeCode, adjusting.typeCode)))
    .for('update');
  const there = held?.units ?? 0;
  if (adjusting.units > there)
    throw new Problem('not enough units', { data: { there, asked: adjusting.units } });
}
