import * as contracts from '@/shared/contracts/terms';
import { post, read, type Route } from '../../http/route';
import { partnerTermsPage, termsPage } from './read-model';
import { setPartnerTerms } from './set-partner-terms';
import { setTerms } from './set-terms';

export const termsRoutes: Route[] = [
  read(contracts.listTerms, 'see terms', ({ db, query, person, at }) =>
    termsPage(db, { query, person, now: at.now }),
  ),
  read(contracts.readPartnerTerms, 'see terms', ({ db, params, person, at }) =>
    partnerTermsPage(db, { partnerId: params.partner, person, now: at.now }),
  ),
  post(contracts.setTerms, 'set terms', ({ tx, params, body, person, at }) =>
    setTerms(tx, { partnerId: params.partner, version: body, personId: person.id, now: at.now }),
  ),
  post(contracts.setPartnerTerms, 'set terms', async ({ tx, params, body, at }) => {
    await setPartnerTerms(tx, { partnerId: params.partner, settings: body, now: at.now });
    return { id: params.partner };
  }),
];
