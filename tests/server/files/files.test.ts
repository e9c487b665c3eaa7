import { aProduct, type Product } from '../../support/app';
import type { Caller } from '../../support/caller';
import { aLane, type Lane, sentEmpties } from '../../support/lane';

let product: Product;
let lane: Lane;
let stranger: Caller;
beforeAll(async () => {
  product = await aProduct('files');
  lane = await aLane(product);
  const other = await product.aCompany();
  stranger = await product.as(await product.aPerson(other, ['clerk']));
});
afterAll(() => product.close());

// One white pixel.
const png = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAQAAAC1HAwCAAAAC0lEQVR42mP8/x8AAwMCAO+ip1sAAAAASUVORK5CYII=',
  'base64',
);
const jpeg = Buffer.from([
  0xff, 0xd8, 0xff, 0xe0, 0, 0x10, 0x4a, 0x46, 0x49, 0x46, 0, 1, 1, 0, 0, 1, 0, 1, 0, 0,
]);
const pdf = Buffer.from('%PDF-1.4\n1 0 obj<</Type/Catalog>>endobj\ntrailer<</Root 1 0 R>>\n%%EOF\n');
const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>');
const html = Buffer.from('<!doctype html><html><script>alert(1)</script></html>');

type Named = { filename: string; contentType: string; key?: string };
const send = (caller: Caller, bytes: Buffer, { key, ...named }: Named) =>
  caller.form('/files', key ? { key } : {}).attach('file', bytes, named);

describe('sending a file', () => {
  it.each([
    ['load.png', 'image/png', png],
    ['load.JPG', 'image/jpeg', jpeg],
    ['note.pdf', 'application/pdf', pdf],
    ['note.pdf', 'application/octet-stream', pdf],
  ])('takes %s claimed as %s', async (filename, contentType, bytes) => {
    const { status, body } = await send(lane.clerk, bytes, { filename, contentType });
    expect(status).toBe(200);
    expect(body).toMatchObject({ name: filename, bytes: bytes.length });
  });

  it.each([
    ['load.png', 'image/png', jpeg],
    ['load.jpg', 'image/png', jpeg],
    ['load.pdf', 'image/png', png],
    ['load.svg', 'image/svg+xml', svg],
    ['load.png', 'image/png', svg],
    ['load.png', 'image/png', html],
    ['page.html', 'text/html', html],
    ['table.csv', 'text/csv', Buffer.from('a;b\n1;2\n')],
  ])('refuses %s claimed as %s when its content is something else or nothing we take', async (...given) => {
    const [filename, contentType, bytes] = given;
    const { status, body } = await send(lane.clerk, bytes, { filename, contentType });
    expect([status, body.code]).toEqual([415, 'file not as named']);
  });

  it('refuses more than 10 MB without keeping anything', async () => {
    const large = Buffer.concat([png, Buffer.alloc(10 * 1024 * 1024)]);
    const { status, body } = await send(lane.clerk, large, { filename: 'a.png', contentType: 'image/png' });
    expect([status, body.code]).toEqual([413, 'too large']);
  });

  it('twice under one key keeps one file; other content under that key is refused', async () => {
    const key = 'photo-one-key';
    const named = { filename: 'once.png', contentType: 'image/png', key };
    const first = await send(lane.clerk, png, named);
    const again = await send(lane.clerk, png, named);
    expect(again.body).toEqual(first.body);
    const other = await send(lane.clerk, Buffer.concat([png, Buffer.from([0])]), named);
    expect([other.status, other.body.code]).toEqual([422, 'key used otherwise']);
  });

  it('is not for an auditor, who changes nothing', async () => {
    const auditor = await product.as(await product.aPerson(lane.operator, ['auditor']));
    const { status } = await send(auditor, png, { filename: 'a.png', contentType: 'image/png' });
    expect(status).toBe(403);
  });
});

describe('reading a file', () => {
  it('not hung on anything is for the company that sent it, and the operator', async () => {
    const { body: file } = await send(lane.clerk, png, { filename: 'own.png', contentType: 'image/png' });
    const own = await lane.clerk.get(`/files/${file.id}`).buffer(true);
    expect(own.status).toBe(200);
    expect(Buffer.compare(own.body as Buffer, png)).toBe(0);
    expect(own.headers['content-disposition']).toContain('attachment; filename="own.png"');
    expect(own.headers['x-content-type-options']).toBe('nosniff');
    expect((await lane.coordinator.get(`/files/${file.id}`)).status).toBe(200);
    expect((await stranger.get(`/files/${file.id}`)).status).toBe(404);
  });

  it('hung on a count is for sender and receiver, never for a third company', async () => {
    const { body: photo } = await send(lane.clerk, jpeg, { filename: 'load.jpg', contentType: 'image/jpeg' });
    const id = await sentEmpties(lane, { [lane.type.code]: 8 });
    const counted = await lane.clerk.post(`/shipments/${id}/counts`, {
      lines: [{ typeCode: lane.type.code, counted: 7 }],
      photoIds: [photo.id],
    });
    expect(counted.status).toBe(200);
    const { body: seen } = await lane.coordinator.get(`/shipments/${id}`);
    expect(seen.counts[0].photos).toEqual([photo]);
    expect((await lane.clerk.get(`/files/${photo.id}`)).status).toBe(200);
    expect((await stranger.get(`/files/${photo.id}`)).status).toBe(404);
  });

  it('cannot be opened by hanging another company’s file on an own count', async () => {
    const secret = await send(lane.coordinator, png, { filename: 'plant.png', contentType: 'image/png' });
    const id = await sentEmpties(lane, { [lane.type.code]: 8 });
    const { status, body } = await lane.clerk.post(`/shipments/${id}/counts`, {
      lines: [{ typeCode: lane.type.code, counted: 8 }],
      photoIds: [secret.body.id],
    });
    expect([status, body.fields[0].path]).toEqual([400, 'photoIds.0']);
    expect((await lane.clerk.get(`/files/${secret.body.id}`)).status).toBe(404);
  });
});
