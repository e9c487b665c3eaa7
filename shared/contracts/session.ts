import { z } from 'zod';
import { abilities, roles } from '../access/abilities';
import { email, id, line } from './fields';
import { operation } from './operation';

export const signedIn = z.object({
  person: z.object({
    id,
    name: z.string(),
    email: z.string(),
    roles: z.array(z.enum(roles)),
    language: z.string(),
  }),
  company: z.object({
    id,
    name: z.string(),
    kind: z.enum(['operator', 'partner']),
    currency: z.string(),
    timeZone: z.string(),
  }),
  abilities: z.array(z.enum(abilities as [string, ...string[]])),
  /** What waits, by place; places without a number are left out. */
  waiting: z.record(z.string(), z.number().int()),
});
export type SignedIn = z.infer<typeof signedIn>;

export const readSession = operation({
  name: 'readSession',
  resource: 'session',
  method: 'GET',
  path: '/session',
  summary: 'Who is signed in, and the token that changing requests carry in x-csrf-token',
  answer: z.object({ csrfToken: z.string(), signedIn: signedIn.nullable() }),
});

/** 8 to 200 characters, no rules of composition (OWASP ASVS 6.2.1, 6.2.5, 6.2.9). */
export const newPassword = z.string().min(8, 'At least 8 characters').max(200, 'At most 200 characters');

export const signIn = operation({
  name: 'signIn',
  resource: 'session',
  method: 'POST',
  path: '/session',
  summary: 'Sign in with e-mail and password',
  keyed: false,
  body: z.object({ email, password: z.string().min(1).max(200) }),
  answer: z.object({ csrfToken: z.string(), signedIn }),
});

export const signOut = operation({
  name: 'signOut',
  resource: 'session',
  method: 'DELETE',
  path: '/session',
  summary: 'Sign out',
  keyed: false,
  answer: z.object({ csrfToken: z.string() }),
});

export const askForReset = operation({
  name: 'askForReset',
  resource: 'session',
  method: 'POST',
  path: '/password-resets',
  summary:
    'Ask for a link to choose a new password; the answer is the same whether or not the address is known',
  keyed: false,
  body: z.object({ email }),
  answer: z.object({ sent: z.literal(true) }),
});

export const choosePassword = operation({
  name: 'choosePassword',
  resource: 'session',
  method: 'POST',
  path: '/passwords',
  summary: 'Choose a password with the token of an invitation or a reset link',
  keyed: false,
  body: z.object({ token: line(200), password: newPassword }),
  answer: z.object({ chosen: z.literal(true) }),
});

export const changePassword = operation({
  name: 'changePassword',
  resource: 'session',
  method: 'POST',
  path: '/session/password',
  summary: 'Change the own password',
  keyed: false,
  body: z.object({ current: z.string().min(1).max(200), password: newPassword }),
  answer: z.object({ csrfToken: z.string() }),
});
