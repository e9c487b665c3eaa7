import { aProduct, type Product } from '../../support/app';

let product: Product;
beforeAll(async () => {
  product = await aProduct('sign-in');
});
afterAll(() => product.close());

describe('signing in', () => {
  it('gives the person, the company and what the role may do', async () => {
    const operator = await product.aCompany({ kind: 'operator', name: 'Fennmark Heat Pumps' });
    const ane = await product.aPerson(operator, ['coordinator'], { name: 'Ane Ravn' });
    const caller = await product.as(ane);
    const { body } = await caller.get('/session');
    expect(body.signedIn.person.name).toBe('Ane Ravn');
    expect(body.signedIn.company).toMatchObject({ kind: 'operator', name: 'Fennmark Heat Pumps' });
    expect(body.signedIn.abilities).toContain('settle differences');
    expect(body.signedIn.abilities).not.toContain('close months');
  });

  it('answers a wrong password and an unknown address alike', async () => {
    const partner = await product.aCompany();
    const clerk = await product.aPerson(partner, ['clerk']);
    const stranger = await product.stranger();
    const wrong = await stranger.post('/session', { email: clerk.email, password: 'not the password' });
    const unknown = await stranger.post('/session', {
      email: 'nobody@tarekeep.example',
      password: 'not the password',
    });
    expect([wrong.status, unknown.status]).toEqual([401, 401]);
    expect({ ...wrong.body, requestId: '' }).toEqual({ ...unknown.body, requestId: '' });
  });

  it('refuses a changing request without the token', async () => {
    const stranger = await product.stranger();
    stranger.token = 'x';
    const response = await stranger.post('/session', {
      email: 'a@tarekeep.example',
      password: 'whatever it is',
    });
    expect(response.status).toBe(403);
    expect(response.body.code).toBe('request not trusted');
  });

  it('ends a session at once when the person is disabled', async () => {
    const partner = await product.aCompany();
    const clerk = await product.aPerson(partner, ['clerk']);
    const caller = await product.as(clerk);
    expect((await caller.get('/session')).body.signedIn).not.toBeNull();
    await product.deps.pool.query('UPDATE people SET active = 0 WHERE id = ?', [clerk.id]);
    expect((await caller.get('/session')).body.signedIn).toBeNull();
  });

  it('slows the eleventh wrong password of an account', async () => {
    const partner = await product.aCompany();
    const clerk = await product.aPerson(partner, ['clerk']);
    const stranger = await product.stranger();
    for (let attempt = 1; attempt <= 10; attempt += 1) {
      expect(
        (await stranger.post('/session', { email: clerk.email, password: `wrong ${attempt}` })).status,
      ).toBe(401);
    }
    expect((await stranger.post('/session', { email: clerk.email, password: 'wrong again' })).status).toBe(
      429,
    );
  });
});
