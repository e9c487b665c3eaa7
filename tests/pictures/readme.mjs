import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** A page opens fast on a poor network too. */
const mostBytes = 150_000;

/**
 * The four pictures of the README.
 * @param {string} root
 * @param {{ as: (email: string) => Promise<import('./camera.mjs').Camera> }} demo
 */
export async function takeReadmePictures(root, { as }) {
  const folder = join(root, 'assets/images/readme');
  mkdirSync(folder, { recursive: true });
  const keep = (/** @type {string} */ name, /** @type {Buffer} */ picture) => {
    if (picture.length > mostBytes)
      throw new Error(`${name} has ${picture.length} bytes, at most ${mostBytes}`);
    writeFileSync(join(folder, name), picture);
    console.log(`    assets/images/readme/${name}, ${Math.round(picture.length / 1000)} kB`);
  };
  const desk = (/** @type {number} */ height) => ({ look: { width: 1440, height } });

  const ane = await as('ane@fennmark.example');
  keep('today.png', await ane.shoot('/', desk(850)));

  const inge = await as('inge@kestrel.example');
  const { rows } = await inge.get('/shipments?state=on%20the%20way&direction=in&sort=expectedOn');
  const count = { look: { width: 390, height: 844 }, before: countTheFirst };
  keep('count.png', await inge.shoot(`/shipments/${rows[0].id}/count`, count));

  const mikkel = await as('mikkel@fennmark.example');
  const statements = await mikkel.get('/statements?answer=disputed');
  keep('statement.png', await mikkel.shoot(`/statements/${statements.rows[0].id}`, desk(850)));

  const sif = await as('sif@fennmark.example');
  keep('pool.png', await sif.shoot('/pool/TOTE-64', desk(850)));
}

/** One line as declared, the next with a number that differs. */
async function countTheFirst(/** @type {import('playwright-core').Page} */ page) {
  const taken = page.getByRole('button', { name: /^As declared: / });
  if ((await taken.count()) > 1) await taken.nth(1).click();
  await page
    .getByRole('button', { name: /^Other number, or damaged: / })
    .first()
    .click();
  const counted = page.getByLabel(/, counted$/).first();
  await counted.fill(String(Number(await counted.inputValue()) - 8));
  await page.evaluate('document.activeElement.blur()');
}
