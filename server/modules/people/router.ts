import * as contracts from '@/shared/contracts/people';
import { post, type PostCall, read, type Route } from '../../http/route';
import { change, invite, sendAgain } from './keep-people';
import { peoplePage, personRowOf } from './read-model';

const sceneOf = ({ person, deps, at }: Pick<PostCall<never>, 'person' | 'deps' | 'at'>) => ({
  keeper: person,
  publicUrl: deps.config.PUBLIC_URL,
  now: at.now,
});

export const peopleRoutes: Route[] = [
  read(contracts.listPeople, 'see people', ({ db, person, query }) => peoplePage(db, person, query)),
  read(contracts.readPersonRow, 'see people', ({ db, person, params }) =>
    personRowOf(db, { person, id: params.person }),
  ),
  post(contracts.invitePerson, 'invite people', async (call) => ({
    id: await invite(call.tx, call.body, sceneOf(call)),
  })),
  post(contracts.inviteAgain, 'invite people', async (call) => {
    await sendAgain(call.tx, call.params.person, sceneOf(call));
    return { id: call.params.person };
  }),
  post(contracts.changePerson, 'invite people', async (call) => {
    await change(call.tx, call.params.person, { body: call.body, scene: sceneOf(call) });
    return { id: call.params.person };
  }),
];
