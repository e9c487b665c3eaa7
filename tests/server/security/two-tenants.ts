import { operatorRoles, partnerRoles } from '@/shared/access/abilities';
import { sealLedger } from '@/server/modules/ledger/seal';
import { aProduct } from '../../support/app';
import type { Caller } from '../../support/caller';
import { csvOf } from '../../support/month-file';
import { partForm, plan } from '../pool/scene';

/** Stands in every name and text of tenant A, and nowhere else. */
export const canary = 'Zephyrine';
export const pdf = Buffer.from('%PDF-1.4\n1 0 obj<</Type/Catalog>>endobj\ntrailer<</Root 1 0 R>>\n%%EOF\n');

/** An answer that must be good, or the scene does not stand. */
async function good(sent: Promise<{ status: number; body: unknown; text: string }>) {
  const { status, body, text } = await sent;
  if (status !== 200) throw new Error(`the scene was answered ${status} ${text}`);
  return body as Record<string, unknown> & { id: string; rows: Record<string, unknown>[] };
}

/** An operator and two partners; everything that the product keeps exists for A, a little for B. */
export async function twoTenants(label: string) {
  const product = await aProduct(label);
  const operator = await product.aCompany({ kind: 'operator', name: 'Fennmark Heat Pumps' });
  const plant = await product.aSite(operator, { name: 'Tarnby Assembly', code: 'TARNBY' });
  const type = await product.aType({ code: 'TOTE-64' });
  const staffPerson = await product.aPerson(operator, operatorRoles, { name: 'Ane Ravn' });
  const a = await aTenant(`${canary} Coil Works`, 'ZEPHYR');
  const b = await aTenant('Orrin Sheet Metal', 'ORRIN');

  async function aTenant(name: string, code: string) {
    const company = await product.aCompany({ name, code, address: `${name}, Dock 2` });
    const site = await product.aSite(company, { name: `${name} dock`, code });
    await product.someTerms(company, type.code);
    const person = await product.aPerson(company, partnerRoles, {
      name: `${name} keeper`,
      email: `keeper@${code.toLowerCase()}.example`,
    });
    return { name, company, site, person };
  }
  type Tenant = typeof a;

  const load = (declared: number) => [{ typeCode: type.code, declared }];
  const lane = (tenant: Tenant, way: 'out' | 'in', on: string) => ({
    fromSiteId: way === 'out' ? plant.id : tenant.site.id,
    toSiteId: way === 'out' ? tenant.site.id : plant.id,
    leftOn: on,
    expectedOn: on,
    note: `${tenant.name} note`,
  });
  const send = async (by: Caller, form: ReturnType<typeof lane>, units: number) =>
    (await good(by.post('/shipments', { ...form, lines: load(units) }))).id;
  const count = async (by: Caller, shipment: string, given: { units: number; photoIds?: string[] }) =>
    good(
      by.post(`/shipments/${shipment}/counts`, {
        lines: [{ typeCode: type.code, counted: given.units, damaged: 0, dirty: 0 }],
        photoIds: given.photoIds ?? [],
      }),
    );
  const aPaper = async (by: Caller, name: string) =>
    (await good(by.form('/files').attach('file', pdf, { filename: name, contentType: 'application/pdf' })))
      .id;

  // February: something to close and to state.
  product.setClock('2026-02-10T09:00:00.000Z');
  const early = {
    staff: await product.as(staffPerson),
    a: await product.as(a.person),
    b: await product.as(b.person),
  };
  for (const [tenant, by] of [
    [a, early.a],
    [b, early.b],
  ] as const)
    await count(by, await send(early.staff, lane(tenant, 'out', '2026-02-10'), 100), { units: 100 });

  product.setClock('2026-03-20T09:00:00.000Z');
  const staff = await product.as(staffPerson);
  const asA = await product.as(a.person);
  const asB = await product.as(b.person);
  await good(staff.post('/months/2026-02/close', { reason: 'agreed' }));
  await product.runJobs();
  await good(staff.post('/months/2026-02/issue'));
  await product.runJobs();

  const ids = { ...(await ofTenant(a, asA)), ...(await ofStaff()) };
  const idsOfB = await ofTenant(b, asB);

  /** Shipments both ways, a file, a difference, a dispute, a statement, an invited person. */
  async function ofTenant(tenant: Tenant, by: Caller) {
    const today = '2026-03-20';
    const photo = await aPaper(by, `${tenant.name} photo.pdf`);
    const counted = await send(staff, lane(tenant, 'out', today), 80);
    await count(by, counted, { units: 75, photoIds: [photo] });
    const onTheWay = await send(staff, lane(tenant, 'out', today), 40);
    const sent = await send(by, lane(tenant, 'in', today), 60);
    await count(staff, sent, { units: 58 });
    const paper = await aPaper(by, `${tenant.name} note.pdf`);
    const dispute = await good(
      by.post('/disputes', {
        subject: 'count',
        shipmentId: sent,
        typeCode: type.code,
        claimed: 60,
        reason: 'counted wrongly',
        text: `${tenant.name} says sixty`,
        fileIds: [paper],
      }),
    );
    const invited = await good(
      by.post('/people', {
        name: `${tenant.name} clerk`,
        email: `new@${tenant.company.code.toLowerCase()}.example`,
        roles: ['clerk'],
      }),
    );
    const statement = (await good(by.get('/statements'))).rows[0] as { id: string };
    const shown = (await by.get(`/statements/${statement.id}`)).body as {
      content: { lines: { id: string }[] };
    };
    const differences = (await good(staff.get('/differences', { partner: tenant.company.id }))).rows as {
      id: string;
    }[];
    return {
      shipment: [counted, onTheWay, sent],
      file: [paper, photo],
      dispute: [dispute.id],
      person: [tenant.person.id, invited.id],
      statement: [statement.id],
      line: shown.content.lines.map((line) => line.id),
      difference: differences.map((row) => row.id),
      company: [tenant.company.id],
      partner: [tenant.company.id],
      site: [tenant.site.id],
    };
  }

  /** What only the operator's people keep, about A. */
  async function ofStaff() {
    const adjusted = (
      await staff.post('/adjustments', {
        kind: 'found',
        siteId: plant.id,
        typeCode: type.code,
        units: 9,
        on: '2026-03-20',
        reason: `${canary} yard walk`,
      })
    ).body as { entryId: number };
    const ends = { type, plant, dock: a.site };
    const part = await good(staff.post('/parts', partForm(ends, { name: `${canary} coil` })));
    await good(staff.put(`/pool/${type.code}/plan`, plan()));
    const { reckoned } = (await staff.get(`/pool/${type.code}`)).body as {
      reckoned: { result: { poolSize: number } };
    };
    const size = reckoned.result.poolSize;
    const levels = [{ siteId: a.site.id, minimum: 10, maximum: 900 }];
    await good(staff.post(`/pool/${type.code}/approvals`, { size, reckoned: size, levels, note: canary }));
    const row = {
      reference: 'ZF-1',
      from: 'TARNBY',
      to: 'ZEPHYR',
      date: '2026-03-18',
      type: type.code,
      units: 30,
    };
    const file = csvOf([
      { side: 'shipment', ...row },
      { side: 'receipt', ...row, date: '2026-03-19' },
    ]);
    const brought = await good(staff.form('/imports').attach('file', file, `${canary}.csv`));
    await good(staff.post(`/imports/${brought.id}/confirmation`, { leaveOut: 0 }));
    await product.runJobs();
    await sealLedger(product.deps);
    const letters = (await good(staff.get('/letters'))).rows as { id: string }[];
    return {
      import: [brought.id],
      part: [part.id],
      letter: [letters[0]?.id ?? ''],
      entry: [String(adjusted.entryId)],
      type: [type.code],
      month: ['2026-02'],
    } as Record<string, string[]>;
  }

  return {
    product,
    operator,
    plant,
    type,
    a,
    b,
    staff,
    asA,
    asB,
    staffPerson,
    ids: ids as Record<string, string[]>,
    idsOfB: idsOfB as Record<string, string[]>,
  };
}
export type Tenants = Awaited<ReturnType<typeof twoTenants>>;
