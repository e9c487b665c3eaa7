import { eq } from 'drizzle-orm';
import { v7 as newId } from 'uuid';
import type { Transaction } from '@/db/client';
import { companies, people, personRoles } from '@/db/schema/companies';
import { databaseErrorNumber } from '@/db/transaction';
import { type Role, rolesFor } from '@/shared/access/abilities';
import type { changePerson, invitePerson } from '@/shared/contracts/people';
import type { BodyOf } from '@/shared/contracts/operation';
import { Problem } from '@/shared/problems/problems';
import { may, type Person } from '../../http/person';
import { invitationMail } from '../../mail/letters';
import { queueMail } from '../../mail/outbox';
import { makeToken } from '../session/tokens';

/** Who keeps people: the administrator everyone, a partner's manager the own company's; for others nobody is there. */
export function refuseOtherCompany(keeper: Person, companyId: string): void {
  if (!may(keeper, 'keep people') && companyId !== keeper.companyId) throw new Problem('not found');
}

type Scene = { keeper: Person; publicUrl: string; now: string };

/** Makes a sign-in without a password and writes the invitation into the outbox. */
export async function invite(
  tx: Transaction,
  body: BodyOf<typeof invitePerson>,
  scene: Scene,
): Promise<string> {
  const companyId = body.company ?? scene.keeper.companyId;
  refuseOtherCompany(scene.keeper, companyId);
  const [company] = await tx.select().from(companies).where(eq(companies.id, companyId));
  if (!company) throw new Problem('not valid', { fields: [{ path: 'company', message: 'No such company' }] });
  refuseRoles(body.roles, company.kind);
  const id = newId();
  try {
    await tx.insert(people).values({
      id,
      companyId,
      name: body.name,
      email: body.email,
      sessionsFrom: scene.now,
      createdAt: scene.now,
    });
  } catch (error) {
    if (databaseErrorNumber(error) !== 1062) throw error;
    throw new Problem('already exists', {
      fields: [{ path: 'email', message: 'This address cannot be used for a new sign-in' }],
    });
  }
  await tx.insert(personRoles).values([...new Set(body.roles)].map((role) => ({ personId: id, role })));
  await sendInvitation(tx, { id, name: body.name, email: body.email, company: company.name }, scene);
  return id;
}

/** Sends the invitation anew to someone who has chosen no password yet. */
export async function sendAgain(tx: Transaction, id: string, scene: Scene): Promise<void> {
  const { person, company } = await keptPerson(tx, id, scene.keeper);
  if (person.passwordHash !== null || !person.active) throw new Problem('state changed');
  await sendInvitation(tx, { ...person, company: company.name }, scene);
}

/** Changes name, roles and use; what the person may do changes with the next request, and open sessions end. */
export async function change(
  tx: Transaction,
  id: string,
  { body, scene }: { body: BodyOf<typeof changePerson>; scene: Scene },
): Promise<void> {
  const { person, company } = await keptPerson(tx, id, scene.keeper);
  refuseRoles(body.roles, company.kind);
  if (id === scene.keeper.id && !body.active) {
    throw new Problem('not valid', {
      fields: [{ path: 'active', message: 'Nobody takes out the sign-in in use' }],
    });
  }
  if (id === scene.keeper.id && may(scene.keeper, 'keep people') && !body.roles.includes('administrator')) {
    throw new Problem('not valid', {
      fields: [{ path: 'roles', message: 'Another administrator must take this role from you' }],
    });
  }
  const changed = !body.active || (await rolesDiffer(tx, { id, roles: body.roles }));
  await tx
    .update(people)
    .set({ name: body.name, active: body.active, ...(changed ? { sessionsFrom: scene.now } : {}) })
    .where(eq(people.id, person.id));
  await tx.delete(personRoles).where(eq(personRoles.personId, id));
  await tx.insert(personRoles).values([...new Set(body.roles)].map((role) => ({ personId: id, role })));
}

async function rolesDiffer(
  tx: Transaction,
  { id, roles }: { id: string; roles: readonly Role[] },
): Promise<boolean> {
  const held = await tx
    .select({ role: personRoles.role })
    .from(personRoles)
    .where(eq(personRoles.personId, id));
  return held.length !== new Set(roles).size || held.some(({ role }) => !roles.includes(role));
}

async function keptPerson(tx: Transaction, id: string, keeper: Person) {
  const [row] = await tx
    .select({ person: people, company: companies })
    .from(people)
    .innerJoin(companies, eq(companies.id, people.companyId))
    .where(eq(people.id, id))
    .for('update');
  if (!row) throw new Problem('not found');
  refuseOtherCompany(keeper, row.company.id);
  return row;
}

function refuseRoles(asked: readonly Role[], kind: 'operator' | 'partner'): void {
  const wrong = asked.filter((role) => !rolesFor(kind).includes(role));
  if (wrong.length === 0) return;
  throw new Problem('not valid', {
    fields: [{ path: 'roles', message: `Not a role of such a company: ${wrong.join(', ')}` }],
  });
}

type Invited = { id: string; name: string; email: string; company: string };

async function sendInvitation(
  tx: Transaction,
  to: Invited,
  { keeper, publicUrl, now }: Scene,
): Promise<void> {
  const token = await makeToken(tx, { personId: to.id, purpose: 'invitation', now });
  const link = `${publicUrl}/choose-password?token=${token}`;
  await queueMail(tx, {
    to,
    now,
    ...invitationMail({ name: to.name, link, by: keeper.name, company: to.company }),
  });
}
