import * as contracts from '@/shared/contracts/partners';
import { post, read, type Route } from '../../http/route';
import { addPartnerWithSite, addSiteTo, changeCompany, changeSiteOf } from './keep-partners';
import { partnersPage, partnerWithSites } from './read-model';

export const partnerRoutes: Route[] = [
  read(contracts.listPartners, 'see partners', ({ db, query }) => partnersPage(db, query)),
  read(contracts.readPartner, 'see partners', ({ db, params }) => partnerWithSites(db, params.partner)),
  post(contracts.addPartner, 'keep partners', async ({ tx, body, at }) => ({
    id: await addPartnerWithSite(tx, { body, now: at.now }),
  })),
  post(contracts.changePartner, 'keep partners', async ({ tx, params, body }) => {
    await changeCompany(tx, params.partner, body);
    return { id: params.partner };
  }),
  post(contracts.addSite, 'keep partners', async ({ tx, params, body, at }) => ({
    id: await addSiteTo(tx, params.partner, { body, now: at.now }),
  })),
  post(contracts.changeSite, 'keep partners', async ({ tx, params, body }) => {
    await changeSiteOf(tx, { companyId: params.partner, siteId: params.site }, body);
    return { id: params.site };
  }),
];
