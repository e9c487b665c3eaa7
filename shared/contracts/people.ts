import { z } from 'zod';
import { roles } from '../access/abilities';
import { email, id, instant, line } from './fields';
import { listQuery, pageOf } from './list';
import { operation } from './operation';

export const personRow = z.object({
  id,
  name: z.string(),
  email: z.string(),
  company: z.object({ id, name: z.string(), kind: z.enum(['operator', 'partner']) }),
  roles: z.array(z.enum(roles)),
  /** "invited": no password chosen yet. */
  state: z.enum(['active', 'invited', 'disabled']),
  lastSignedInAt: instant.nullable(),
});
export type PersonRow = z.infer<typeof personRow>;

export const listPeople = operation({
  name: 'listPeople',
  resource: 'people',
  method: 'GET',
  path: '/people',
  summary: 'People with their roles: all for the administrator, the own company’s for a partner’s manager',
  query: listQuery.extend({
    company: id.optional(),
    state: z.enum(['active', 'invited', 'disabled']).optional(),
  }),
  answer: pageOf(personRow),
});

export const readPersonRow = operation({
  name: 'readPersonRow',
  resource: 'people',
  method: 'GET',
  path: '/people/:person',
  summary: 'One person with roles',
  params: z.object({ person: id }),
  answer: personRow,
});

const someRoles = z.array(z.enum(roles)).min(1, 'Choose at least one role');

export const invitePerson = operation({
  name: 'invitePerson',
  resource: 'people',
  method: 'POST',
  path: '/people',
  summary: 'Make a sign-in and send the invitation by mail',
  body: z.object({ name: line(120), email, company: id.optional(), roles: someRoles }),
  answer: z.object({ id }),
});

export const inviteAgain = operation({
  name: 'inviteAgain',
  resource: 'people',
  method: 'POST',
  path: '/people/:person/invitations',
  summary: 'Send the invitation again; the earlier link ends',
  params: z.object({ person: id }),
  answer: z.object({ id }),
});

export const changePerson = operation({
  name: 'changePerson',
  resource: 'people',
  method: 'PUT',
  path: '/people/:person',
  summary: 'Change name, roles or use of a sign-in; ends the person’s sessions',
  params: z.object({ person: id }),
  body: z.object({ name: line(120), roles: someRoles, active: z.boolean() }),
  answer: z.object({ id }),
});
