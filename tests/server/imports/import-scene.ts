import type { Response } from 'supertest';
import { aProduct, type Product } from '../../support/app';
import { asOwner } from '../../support/database';
import type { Caller } from '../../support/caller';
import { csvOf, type MonthRow } from '../../support/month-file';

export type ImportScene = {
  product: Product;
  coordinator: Caller;
  clerk: Caller;
  upload: (file: Buffer, name?: string) => Promise<Response>;
  /** Uploads rows, confirms them and runs the job; gives the id of the import. */
  bringIn: (rows: readonly MonthRow[], leaveOut?: number) => Promise<string>;
};

/** Fennmark with both plants, and Pallwick and Orrin with terms for two types. The day is 20 March 2026. */
export async function anImportScene(label: string): Promise<ImportScene> {
  const product = await aProduct(label);
  const operator = await product.aCompany({ kind: 'operator', name: 'Fennmark Heat Pumps' });
  await product.aSite(operator, { code: 'TARNBY', name: 'Tarnby Assembly' });
  await product.aSite(operator, { code: 'OSTREL', name: 'Ostrel Compressor Hall' });
  for (const code of ['TOTE-64', 'LID-128']) await product.aType({ code });
  await product.aType({ code: 'RACK-CP' });
  const clerks = [];
  for (const [code, name] of [
    ['PALLWICK', 'Pallwick Fasteners'],
    ['ORRIN', 'Orrin Sheet Metal'],
  ] as const) {
    const partner = await product.aCompany({ name });
    await product.aSite(partner, { code, name });
    for (const type of ['TOTE-64', 'LID-128']) await product.someTerms(partner, type);
    clerks.push(await product.aPerson(partner, ['clerk']));
  }
  const coordinator = await product.as(
    await product.aPerson(operator, ['coordinator'], { name: 'Ane Ravn' }),
  );
  const clerk = await product.as(clerks[0] as { email: string });
  const upload = (file: Buffer, name = 'march.csv'): Promise<Response> =>
    coordinator
      .form('/imports')
      .attach('file', file, name)
      .then((response) => response);
  const bringIn = async (rows: readonly MonthRow[], leaveOut = 0): Promise<string> => {
    const { body } = await upload(csvOf(rows));
    const confirmed = await coordinator.post(`/imports/${body.id}/confirmation`, { leaveOut });
    if (confirmed.status !== 200) throw new Error(`confirmation answered ${confirmed.text}`);
    await product.runJobs();
    return String(body.id);
  };
  return { product, coordinator, clerk, upload, bringIn };
}

export const aShipment = (given: Partial<MonthRow> = {}): MonthRow => ({
  side: 'shipment',
  reference: 'EM-1001',
  from: 'TARNBY',
  to: 'PALLWICK',
  date: '2026-03-02',
  type: 'TOTE-64',
  units: 400,
  ...given,
});

export const aReceipt = (given: Partial<MonthRow> = {}): MonthRow => ({
  ...aShipment(),
  side: 'receipt',
  date: '2026-03-03',
  ...given,
});

/** Rows of a table, counted in the database itself. */
export async function rowsIn({ deps }: Product, table: string): Promise<number> {
  const [rows] = await deps.pool.query(`SELECT COUNT(*) AS n FROM ${table}`);
  return Number((rows as { n: number }[])[0]?.n);
}

const moved = [
  'settlements',
  'differences',
  'partner_events',
  'daily_nets',
  'balances',
  'ledger_lines',
  'ledger_entries',
  'receipt_matches',
  'receipt_lines',
  'receipts',
  'import_documents',
  'import_rows',
  'imports',
  'count_lines',
  'counts',
  'shipment_lines',
  'shipments',
  'jobs',
  'months',
];

/** Takes all movements out of a test's book, which only the owner of its tables can. */
export async function emptyBook({ database }: Product): Promise<void> {
  await asOwner(database.name, async (owner) => {
    await owner.query('SET foreign_key_checks = 0');
    for (const table of moved) await owner.query(`TRUNCATE TABLE ${table}`);
    await owner.query("DELETE FROM accounts WHERE kind IN ('site', 'transit')");
  });
}
