import type { Request, Response } from 'express';
import type { Readable } from 'node:stream';
import type { Database, Transaction } from '@/db/client';
import type { Ability } from '@/shared/access/abilities';
import type { AnswerOf, BodyOf, Operation, ParamsOf, QueryOf, Shaped } from '@/shared/contracts/operation';
import type { Deps } from '../deps';
import type { Person } from './person';

export type UploadedFile = { field: string; name: string; mediaType: string; bytes: Buffer; sha256: string };

/** Who asks, from where and when. */
export type Circumstances = { requestId: string; address: string; now: string; key?: string };

type Parsed<O extends Shaped> = { params: ParamsOf<O>; query: QueryOf<O>; body: BodyOf<O> };
export type ReadCall<O extends Shaped> = Parsed<O> & {
  db: Database;
  person: Person;
  deps: Deps;
  at: Circumstances;
};
/** `tx` is the one transaction of the request: the effect, the log row and the stored answer commit together. */
export type PostCall<O extends Shaped> = Parsed<O> & {
  tx: Transaction;
  person: Person;
  deps: Deps;
  at: Circumstances;
  files: UploadedFile[];
};
export type OpenCall<O extends Shaped> = Parsed<O> & {
  db: Database;
  deps: Deps;
  at: Circumstances;
  request: Request;
  response: Response;
};

export type FileAnswer = { name: string; mediaType: string; content: Buffer | Readable; inline?: boolean };

type AnyOperation = Operation;
export type Route =
  | {
      kind: 'read';
      operation: AnyOperation;
      ability: Ability;
      handle: (call: ReadCall<never>) => Promise<unknown>;
    }
  | {
      kind: 'file';
      operation: AnyOperation;
      ability: Ability;
      handle: (call: ReadCall<never>) => Promise<FileAnswer>;
    }
  | {
      kind: 'post';
      operation: AnyOperation;
      ability: Ability;
      handle: (call: PostCall<never>) => Promise<unknown>;
    }
  | {
      kind: 'open';
      operation: AnyOperation;
      ability: null;
      handle: (call: OpenCall<never>) => Promise<unknown>;
    };

/** A question: reads, never writes. */
export function read<O extends Operation>(
  operation: O,
  ability: Ability,
  handle: (call: ReadCall<O>) => Promise<AnswerOf<O>>,
): Route {
  return { kind: 'read', operation, ability, handle } as unknown as Route;
}

/** A download: streamed as an attachment. */
export function file<O extends Operation>(
  operation: O,
  ability: Ability,
  handle: (call: ReadCall<O>) => Promise<FileAnswer>,
): Route {
  return { kind: 'file', operation, ability, handle } as unknown as Route;
}

/** A change: one transaction, at most one effect per key. */
export function post<O extends Operation>(
  operation: O,
  ability: Ability,
  handle: (call: PostCall<O>) => Promise<AnswerOf<O>>,
): Route {
  return { kind: 'post', operation, ability, handle } as unknown as Route;
}

/** The few that nobody need be signed in for. */
export function open<O extends Operation>(
  operation: O,
  handle: (call: OpenCall<O>) => Promise<AnswerOf<O>>,
): Route {
  return { kind: 'open', operation, ability: null, handle } as unknown as Route;
}
