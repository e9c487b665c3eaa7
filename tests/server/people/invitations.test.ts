import { sendWaiting } from '@/server/mail/send-waiting';
import { aProduct, type Product } from '../../support/app';
import { Caller } from '../../support/caller';

let product: Product;
beforeAll(async () => {
  product = await aProduct('people');
});
afterAll(() => product.close());

async function anOperator() {
  const operator = await product.aCompany({ kind: 'operator', name: 'Fennmark Heat Pumps' });
  const jonas = await product.aPerson(operator, ['administrator'], { name: 'Jonas Lykke' });
  return { operator, administrator: await product.as(jonas), jonas };
}

/** The last message to an address, as the administrator reads it in the product. */
async function lastLetter(
  administrator: Caller,
  address: string,
): Promise<{ subject: string; text: string; state: string }> {
  const { body } = await administrator.get('/letters', { search: address });
  return body.rows[0];
}

const tokenIn = (text: string): string => /token=([\w-]+)/.exec(text)?.[1] ?? '';

describe('an invitation', () => {
  it('reaches the person, lets them choose a password once, and lets them in', async () => {
    const { administrator } = await anOperator();
    const partner = await product.aCompany({ name: 'Kestrel Coil Works' });
    const invited = await administrator.post('/people', {
      name: 'Inge Madsen',
      email: 'inge@kestrel.example',
      company: partner.id,
      roles: ['clerk'],
    });
    expect(invited.status).toBe(200);
    await sendWaiting(product.deps, null);
    const letter = await lastLetter(administrator, 'inge@kestrel.example');
    expect(letter).toMatchObject({ state: 'captured', subject: 'Your sign-in for Kestrel Coil Works' });

    const stranger = await product.stranger();
    const choice = { token: tokenIn(letter.text), password: 'tide tables and gulls' };
    expect((await stranger.post('/passwords', choice)).status).toBe(200);
    const again = await stranger.post('/passwords', choice);
    expect([again.status, again.body.code]).toEqual([400, 'link not valid']);

    const inge = await Caller.signedIn(product.app, 'inge@kestrel.example', 'tide tables and gulls');
    expect((await inge.get('/session')).body.signedIn.company.name).toBe('Kestrel Coil Works');
  });

  it('cannot give a partner a role of the operator', async () => {
    const { administrator } = await anOperator();
    const partner = await product.aCompany();
    const refused = await administrator.post('/people', {
      name: 'A',
      email: 'a1@x.example',
      company: partner.id,
      roles: ['finance'],
    });
    expect(refused.status).toBe(400);
    expect(refused.body.fields[0].path).toBe('roles');
  });

  it('lets a partner’s manager invite into the own company and into no other', async () => {
    const partner = await product.aCompany();
    const other = await product.aCompany();
    const manager = await product.as(await product.aPerson(partner, ['manager']));
    const own = await manager.post('/people', {
      name: 'New Clerk',
      email: 'new@own.example',
      roles: ['clerk'],
    });
    expect(own.status).toBe(200);
    const foreign = await manager.post('/people', {
      name: 'New',
      email: 'n@other.example',
      company: other.id,
      roles: ['clerk'],
    });
    expect([foreign.status, foreign.body.code]).toEqual([404, 'not found']);
    const { body } = await manager.get('/people');
    expect(
      body.rows
        .map((row: { company: { id: string } }) => row.company.id)
        .every((id: string) => id === partner.id),
    ).toBe(true);
  });

  it('answers a forgotten password alike for known and unknown addresses, and writes only to the known', async () => {
    const { administrator, jonas } = await anOperator();
    const stranger = await product.stranger();
    const known = await stranger.post('/password-resets', { email: jonas.email });
    const unknown = await stranger.post('/password-resets', { email: 'nobody@nowhere.example' });
    expect([known.status, known.body]).toEqual([unknown.status, unknown.body]);
    await product.runJobs();
    expect((await lastLetter(administrator, jonas.email)).subject).toBe('Choose a new password');
    expect(await lastLetter(administrator, 'nobody@nowhere.example')).toBeUndefined();
  });
});

describe('a change of roles', () => {
  it('holds at once and ends the open sessions', async () => {
    const { administrator, operator } = await anOperator();
    const mikkel = await product.aPerson(operator, ['finance'], { name: 'Mikkel Thorn' });
    const caller = await product.as(mikkel);
    product.setClock('2026-03-20T09:01:00.000Z');
    const changed = await administrator.put(`/people/${mikkel.id}`, {
      name: 'Mikkel Thorn',
      roles: ['auditor'],
      active: true,
    });
    expect(changed.status).toBe(200);
    expect((await caller.get('/session')).body.signedIn).toBeNull();
  });

  it('cannot take the administrator role from oneself', async () => {
    const { administrator, jonas } = await anOperator();
    const refused = await administrator.put(`/people/${jonas.id}`, {
      name: 'Jonas',
      roles: ['auditor'],
      active: true,
    });
    expect(refused.status).toBe(400);
  });
});
