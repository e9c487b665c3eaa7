import { type Request, type Response, Router } from 'express';
import { once } from 'node:events';
import { pipeline } from 'node:stream/promises';
import { Readable } from 'node:stream';
import { inTransaction } from '@/db/transaction';
import { Problem } from '@/shared/problems/problems';
import type { Deps } from '../deps';
import { instantOf } from '../deps';
import { writeLog } from '../modules/log/write-log';
import { contentHash, idempotencyKey, keepAnswer, takeKey } from './keyed';
import { parsed } from './parse';
import { may, type Person } from './person';
import type { Circumstances, FileAnswer, Route, UploadedFile } from './route';
import { readUpload } from './upload';

type Asked = { params: unknown; query: unknown; body: unknown };

/** Puts every route on one router: parse, who, may, do, answer. */
export function mount(routes: readonly Route[], deps: Deps): Router {
  const router = Router({ caseSensitive: true });
  for (const route of routes) {
    const method = route.operation.method.toLowerCase() as 'get' | 'post' | 'put' | 'delete';
    router[method](route.operation.path, (request, response) => serve(route, { request, response, deps }));
  }
  return router;
}

type Exchange = { request: Request; response: Response; deps: Deps };

async function serve(route: Route, exchange: Exchange): Promise<void> {
  const { request, response, deps } = exchange;
  const at = circumstancesOf(exchange);
  if (route.kind === 'open') {
    const answer = await route.handle({
      ...asked(route, request),
      db: deps.db,
      deps,
      at,
      request,
      response,
    } as never);
    answered(response, checked(route, answer));
    return;
  }
  const person = request.person;
  if (!person) throw new Problem('not signed in');
  if (!may(person, route.ability)) throw new Problem('not allowed');
  if (route.kind === 'post') {
    const files = route.operation.sends === 'files' ? await readUpload(request, response) : [];
    answered(response, checked(route, await change(route, { ...exchange, at, person, files })));
    return;
  }
  const call = { ...asked(route, request), db: deps.db, person, deps, at } as never;
  if (route.kind === 'file') await sendFile(response, await handedOut(route, { call, person, at, deps }));
  else answered(response, checked(route, await route.handle(call)));
}

/** Unless the time for an answer ran out before. */
function answered(response: Response, body: unknown): void {
  if (!response.headersSent) response.json(body);
}

type HandingOut = { call: never; person: Person; at: Circumstances; deps: Deps };

/** What leaves as a file is written in the log before its first byte. */
async function handedOut(
  route: Extract<Route, { kind: 'file' }>,
  { call, person, at, deps }: HandingOut,
): Promise<FileAnswer> {
  const answer = await route.handle(call);
  if (!Buffer.isBuffer(answer.content)) await begun(answer.content);
  const subject = subjectOf(route, call, null);
  await writeLog(deps.db, { at, person, action: route.operation.name, outcome: 'done', subject });
  return answer;
}

/** Waits for the first bytes: what is refused while they are made is then answered like any other refusal. */
async function begun(content: Readable): Promise<void> {
  // An error in the moments when nobody reads would end the program.
  content.on('error', () => undefined);
  if (content.readableLength === 0 && !content.readableEnded) await once(content, 'readable');
}

type Change = Exchange & { at: Circumstances; person: Person; files: UploadedFile[] };

/** One transaction: take the key, do the work, write the log, keep the answer. */
async function change(route: Extract<Route, { kind: 'post' }>, scene: Change): Promise<unknown> {
  const { request, deps, person, files } = scene;
  const call = asked(route, request);
  const at = route.operation.keyed ? { ...scene.at, key: keyOf(request) } : scene.at;
  const key = {
    personId: person.id,
    key: at.key ?? '',
    operation: route.operation.name,
    hash: contentHash({ ...call, files: files.map((file) => [file.field, file.name, file.sha256]) }),
    now: at.now,
  };
  return inTransaction(deps.db, async (tx) => {
    const before = route.operation.keyed ? await takeKey(tx, key) : null;
    if (before) return before.answer;
    const answer = await route.handle({ ...call, tx, person, deps, at, files } as never);
    await writeLog(tx, {
      at,
      person,
      action: route.operation.name,
      outcome: 'done',
      subject: subjectOf(route, call, answer),
    });
    if (route.operation.keyed) await keepAnswer(tx, key, checked(route, answer));
    return answer;
  });
}

function asked(route: Route, request: Request): Asked {
  const { operation } = route;
  return {
    params: parsed(operation.params, request.params, 'params'),
    query: parsed(operation.query, request.query, 'query'),
    body: operation.body ? parsed(operation.body, bodyOf(request), 'body') : undefined,
  };
}

/** A form with files carries its JSON in the text field "body". */
function bodyOf(request: Request): unknown {
  const body: unknown = request.body;
  if (!request.is('multipart/form-data')) return body ?? {};
  const text = typeof body === 'object' && body !== null && 'body' in body ? body.body : '{}';
  try {
    return JSON.parse(String(text)) as unknown;
  } catch {
    throw new Problem('not valid', { fields: [{ path: '', message: 'The field "body" is not JSON' }] });
  }
}

function keyOf(request: Request): string {
  const key = idempotencyKey.safeParse(request.get('idempotency-key'));
  if (!key.success) throw new Problem('key missing');
  return key.data;
}

function circumstancesOf({ request, deps }: Exchange): Circumstances {
  return { requestId: String(request.id), address: request.ip ?? '', now: instantOf(deps.clock) };
}

/** Answers pass through their schema: what is not named there never leaves the server. */
function checked(route: Route, answer: unknown): unknown {
  const result = route.operation.answer.safeParse(answer);
  if (!result.success)
    throw new Error(
      `${route.operation.name} answered what its contract does not say: ${result.error.message}`,
    );
  return result.data;
}

function subjectOf(route: Route, call: Asked, answer: unknown): { kind: string; id: string | null } {
  const fromAnswer =
    typeof answer === 'object' && answer !== null && 'id' in answer ? String(answer.id) : null;
  const params = Object.values((call.params ?? {}) as Record<string, unknown>);
  return {
    kind: route.operation.resource,
    id: fromAnswer ?? (params.length > 0 ? String(params.at(-1)) : null),
  };
}

async function sendFile(response: Response, answer: FileAnswer): Promise<void> {
  if (response.headersSent) return;
  const how = answer.inline ? 'inline' : 'attachment';
  const plain = answer.name.replace(/[^\x20-\x7e]|["\\]/g, '_');
  response.setHeader('content-type', answer.mediaType);
  response.setHeader(
    'content-disposition',
    `${how}; filename="${plain}"; filename*=UTF-8''${encodeURIComponent(answer.name)}`,
  );
  response.setHeader('content-security-policy', "sandbox; default-src 'none'; style-src 'unsafe-inline'");
  response.setHeader('x-content-type-options', 'nosniff');
  response.setHeader('cache-control', 'private, no-store');
  const content = Buffer.isBuffer(answer.content) ? Readable.from([answer.content]) : answer.content;
  await pipeline(content, response);
}
