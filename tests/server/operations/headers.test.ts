import { createConnection } from 'node:net';
import { createServer, type Server } from 'node:http';
import { gzipSync } from 'node:zlib';
import type { AddressInfo } from 'node:net';
import { aProduct, type Product } from '../../support/app';
import type { Caller } from '../../support/caller';
import { aLane, type Lane } from '../../support/lane';

let product: Product;
let lane: Lane;
beforeAll(async () => {
  product = await aProduct('headers');
  lane = await aLane(product);
});
afterAll(() => product.close());

type Answer = { status: number; headers: Record<string, string> };
const json = { 'content-type': 'application/json' };

describe('every answer', () => {
  it('carries the headers that keep a browser safe, whatever it is', async () => {
    const stranger: Caller = await product.stranger();
    const answers: Record<string, PromiseLike<unknown>> = {
      'a list': lane.coordinator.get('/shipments'),
      'a refusal': lane.clerk.get('/log'),
      'nobody signed in': stranger.get('/shipments'),
      'no such thing': lane.coordinator.get('/nothing-here'),
      'a bad address': lane.coordinator.get('/shipments/%E0%A4%A'),
      'a bad body': lane.coordinator.post('/shipments', '{', { headers: json }),
      'a file': lane.coordinator.get('/import-template', { as: 'csv' }),
      'a health check': stranger.get('/health'),
      'the contract': stranger.get('/openapi.json'),
    };
    for (const [what, asked] of Object.entries(answers)) {
      const { headers } = (await asked) as Answer;
      expect([what, headers['x-content-type-options']]).toEqual([what, 'nosniff']);
      expect([what, headers['referrer-policy']]).toEqual([what, 'no-referrer']);
      expect([what, headers['cross-origin-resource-policy']]).toEqual([what, 'same-origin']);
      expect([what, headers['cache-control']]).toEqual([what, expect.stringContaining('no-store')]);
      expect([what, headers['content-security-policy']]).toEqual([
        what,
        expect.stringMatching(/default-src 'none'/),
      ]);
      expect([what, headers['x-request-id']]).toEqual([what, expect.stringMatching(/^[0-9a-f-]{36}$/)]);
      expect([what, headers['x-powered-by'], headers['access-control-allow-origin']]).toEqual([
        what,
        undefined,
        undefined,
      ]);
    }
    const page = (await answers['a list']) as Answer;
    expect(page.headers['content-security-policy']).toContain("frame-ancestors 'none'");
    const paper = (await answers['a file']) as Answer;
    expect(paper.headers['content-security-policy']).toMatch(/^sandbox/);
    expect(paper.headers['content-disposition']).toMatch(/^attachment; filename="/);
  });
});

describe('a body', () => {
  const post = (raw: string) => lane.coordinator.post('/adjustments', raw, { headers: json });

  it('over 1 MB is refused as too large, also when it comes compressed', async () => {
    const { status, body } = await post(JSON.stringify({ reason: 'x'.repeat(1_100_000) }));
    expect([status, body.code]).toEqual([413, 'too large']);
    const bomb = gzipSync(JSON.stringify({ reason: 'x'.repeat(30_000_000) }));
    const packed = await lane.coordinator
      .post('/adjustments', undefined, { headers: { ...json, 'content-encoding': 'gzip' } })
      .serialize(() => bomb as never)
      .send({});
    expect([bomb.length < 100_000, packed.status]).toEqual([true, 413]);
    const broken = await lane.coordinator
      .post('/adjustments', undefined, { headers: { ...json, 'content-encoding': 'gzip' } })
      .serialize(() => 'no gzip at all')
      .send({});
    expect(broken.status).toBe(400);
  });

  it.each([
    ['nested 100 000 deep', `${'['.repeat(100_000)}${']'.repeat(100_000)}`],
    ['an object nested deep', `${'{"a":'.repeat(20_000)}1${'}'.repeat(20_000)}`],
    ['with the keys of prototypes', '{"__proto__":{"units":5},"constructor":{"prototype":{"units":5}}}'],
    ['that is no object', '"text"'],
    ['cut off', '{"units": 5'],
    ['with a NUL', '{"units":\u00005}'],
  ])('%s is refused and leaves objects as they were', async (_what, raw) => {
    const { status } = await post(raw);
    expect(status).toBe(400);
    expect(({} as Record<string, unknown>).units).toBeUndefined();
  });

  it('in a charset or coding that is not known is refused', async () => {
    for (const headers of [
      { 'content-type': 'application/json; charset=utf-7' },
      { ...json, 'content-encoding': 'compress' },
    ]) {
      const { status } = await lane.coordinator.post('/adjustments', '{}', { headers });
      expect([400, 415]).toContain(status);
    }
  });
});

describe('a slow or oversized request', () => {
  let server: Server;
  beforeAll(async () => {
    // The limits of server/index.ts in small: how long the head of a request may take, and how large it may be.
    server = createServer(
      { maxHeaderSize: 16_384, headersTimeout: 300, connectionsCheckingInterval: 100 },
      product.app,
    );
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  });
  afterAll(() => server.close());

  const said = (head: string): Promise<string> =>
    new Promise((resolve) => {
      let answer = '';
      const socket = createConnection((server.address() as AddressInfo).port, '127.0.0.1', () =>
        socket.write(head),
      );
      socket.on('data', (data) => (answer += data.toString()));
      socket.on('error', () => undefined);
      socket.on('close', () => resolve(answer));
    });

  it('is cut off: a head that does not end, one that is too large, two lengths', async () => {
    expect(await said('GET /api/health HTTP/1.1\r\nHost: x\r\nX-Slow: ')).toMatch(/^HTTP\/1\.1 408/);
    expect(await said(`GET /api/health HTTP/1.1\r\nHost: x\r\nX: ${'a'.repeat(20_000)}\r\n\r\n`)).toMatch(
      /^HTTP\/1\.1 431/,
    );
    const smuggled =
      'POST /api/session HTTP/1.1\r\nHost: x\r\nContent-Length: 4\r\nTransfer-Encoding: chunked\r\n\r\n0\r\n\r\n';
    expect(await said(smuggled)).toMatch(/^HTTP\/1\.1 400/);
  });
});
