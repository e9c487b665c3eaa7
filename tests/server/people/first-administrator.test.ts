import { inTransaction } from '@/db/transaction';
import { readWanted, writeFirstAdministrator } from '@/seeds/reference/first-administrator';
import { aProduct, type Product } from '../../support/app';
import { Caller } from '../../support/caller';

let product: Product;
beforeAll(async () => {
  product = await aProduct('first-administrator');
});
afterAll(() => product.close());

const environment = {
  OPERATOR_NAME: 'Fennmark Heat Pumps',
  OPERATOR_CODE: 'FENNMARK',
  OPERATOR_CURRENCY: 'EUR',
  PLANT_NAME: 'Tarnby Assembly',
  PLANT_CODE: 'TARNBY',
  PLANT_TIME_ZONE: 'Europe/Copenhagen',
  ADMINISTRATOR_NAME: 'Jonas Lykke',
  ADMINISTRATOR_EMAIL: 'jonas@fennmark.example',
};

describe('the first administrator of an empty book', () => {
  it('chooses a password with the printed link, signs in and may invite others; a second one is refused', async () => {
    const now = product.deps.clock.now().toISOString();
    const make = () =>
      inTransaction(product.deps.db, (tx) => writeFirstAdministrator(tx, readWanted(environment), now));
    const token = await make();
    await (await product.stranger()).post('/passwords', { token, password: 'a lamp over the dock' });
    const jonas = await Caller.signedIn(product.app, environment.ADMINISTRATOR_EMAIL, 'a lamp over the dock');
    const invited = await jonas.post('/people', {
      name: 'Ane Ravn',
      email: 'ane@fennmark.example',
      roles: ['coordinator'],
    });
    expect(invited.status).toBe(200);
    await expect(make()).rejects.toThrow('There is an operator already');
  });

  it('is not made from half a description: every name that is missing or wrong is said', () => {
    const half = {
      ...environment,
      OPERATOR_CURRENCY: 'EURO',
      PLANT_TIME_ZONE: 'Tarnby',
      ADMINISTRATOR_EMAIL: undefined,
    };
    expect(() => readWanted(half)).toThrow(
      /OPERATOR_CURRENCY[\s\S]*PLANT_TIME_ZONE[\s\S]*ADMINISTRATOR_EMAIL/,
    );
  });
});
