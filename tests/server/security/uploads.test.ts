import { readdir } from 'node:fs/promises';
import { connect } from 'node:net';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { setTimeout as pause } from 'node:timers/promises';
import { aProduct, type Product } from '../../support/app';
import { aLane, counted, type Lane, sentEmpties } from '../../support/lane';
import { pdf } from './two-tenants';
import { signedIn } from './browser';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('uploads');
  lane = await aLane(product);
});
afterAll(() => product.close());

const png = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAQAAAC1HAwCAAAAC0lEQVR42mP8/x8AAwMCAO+ip1sAAAAASUVORK5CYII=',
  'base64',
);
const script = '<script>alert(document.cookie)</script>';
const svg = Buffer.from(`<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg">${script}</svg>`);
const send = (bytes: Buffer, filename: string, contentType: string) =>
  lane.clerk.form('/files').attach('file', bytes, { filename, contentType });
const onDisk = async (): Promise<string[]> =>
  (await readdir(product.deps.config.FILES_DIR, { recursive: true })).filter((name) =>
    /[0-9a-f]{64}|part/.test(name),
  );
const rows = async () => (await product.deps.pool.query('SELECT name FROM files'))[0] as { name: string }[];

describe('a file of ill will', () => {
  it.each([
    ['an SVG with a script', svg, 'photo.svg', 'image/svg+xml', 415],
    ['an SVG that calls itself a PNG', svg, 'photo.png', 'image/png', 415],
    [
      'a web page that calls itself a PDF',
      Buffer.from(`<html>${script}`),
      'note.pdf',
      'application/pdf',
      415,
    ],
    ['a PDF named as a web page', pdf, 'note.html', 'application/pdf', 415],
    ['a PNG claimed as a web page', png, 'photo.png', 'text/html', 415],
    ['a program', Buffer.from('MZ\u0090\u0000\u0003'), 'photo.png', 'image/png', 415],
    ['nothing', Buffer.alloc(0), 'photo.png', 'image/png', 400],
    [
      'a byte too many',
      Buffer.concat([png, Buffer.alloc(10 * 1024 * 1024 + 1 - png.length)]),
      'photo.png',
      'image/png',
      413,
    ],
  ])('is refused and not kept: %s', async (_what, ...[bytes, filename, contentType, status]) => {
    expect((await send(bytes, filename, contentType)).status).toBe(status);
    expect([await rows(), await onDisk()]).toEqual([[], []]);
  });

  it('broken off half way leaves nothing, and the server serves on', async () => {
    const server: Server = createServer(product.app);
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    const held = await signedIn(product.app, lane.ivo.email);
    const socket = connect((server.address() as AddressInfo).port, '127.0.0.1');
    const head = [
      'POST /api/files HTTP/1.1',
      'Host: x',
      `Cookie: ${held.cookie}`,
      `X-CSRF-Token: ${held.token}`,
      'Idempotency-Key: broken-off-upload',
      'Content-Type: multipart/form-data; boundary=b',
      'Content-Length: 5000000',
    ].join('\r\n');
    const part =
      '--b\r\nContent-Disposition: form-data; name="file"; filename="a.png"\r\nContent-Type: image/png\r\n\r\n';
    socket.write(`${head}\r\n\r\n${part}`);
    socket.write(Buffer.concat([png, Buffer.alloc(200_000)]));
    await pause(200);
    socket.destroy();
    await pause(300);
    expect([await rows(), await onDisk()]).toEqual([[], []]);
    expect((await lane.clerk.get('/shipments')).status).toBe(200);
    server.close();
  });

  it('with a name that leads elsewhere, never ends, or forges a header is kept under a plain one', async () => {
    const names = [
      '../../../etc/cron.d/evil.pdf',
      '..\\..\\evil.pdf',
      `${'n'.repeat(10_000)}.pdf`,
      'a\u202efdp.exe.pdf',
    ];
    for (const name of names) {
      const { status, body } = await send(pdf, name, 'application/pdf');
      expect(status).toBe(200);
      expect(body.name).toMatch(/^[^/\\\u202e]{1,120}$/);
      expect(body.name).not.toContain('..');
    }
    // One content, one file, under its hash.
    expect(await onDisk()).toEqual([expect.stringMatching(/^[0-9a-f]{2}\/[0-9a-f]{64}$/)]);
  });

  it('that is two things at once comes back as the one it was taken for, and as nothing a browser would run', async () => {
    const polyglot = Buffer.concat([pdf, Buffer.from(`<html>${script}</html>`)]);
    const { body } = await send(polyglot, 'über "note" ＝1.pdf', 'application/pdf');
    const id = await sentEmpties(lane, { [lane.type.code]: 1 });
    await lane.clerk.post(`/shipments/${id}/counts`, {
      ...counted({ [lane.type.code]: 1 }),
      photoIds: [body.id],
    });
    const { headers } = await lane.coordinator.get(`/files/${body.id}`).buffer(true);
    expect(headers['content-type']).toBe('application/pdf');
    expect(headers['content-disposition']).toMatch(
      /^attachment; filename="[\x20-\x7e]+"; filename\*=UTF-8''%C3%BCber/,
    );
    expect(headers['x-content-type-options']).toBe('nosniff');
    expect(headers['content-security-policy']).toMatch(/^sandbox; default-src 'none'/);
  });
});
