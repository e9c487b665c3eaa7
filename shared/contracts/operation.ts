import type { z } from 'zod';

export type Method = 'GET' | 'POST' | 'PUT' | 'DELETE';
type Shape = z.ZodType;

/**
 * One thing the server can be asked to do. The same value types the handler, the caller and the form,
 * and becomes a path in the OpenAPI document.
 */
export type Operation<
  Params extends Shape = Shape,
  Query extends Shape = Shape,
  Body extends Shape = Shape,
  Answer extends Shape = Shape,
> = {
  /** Stable name, e.g. "countShipment"; also the OpenAPI operationId. */
  name: string;
  /** The noun it belongs to, e.g. "shipments"; groups pages of the document and cached queries. */
  resource: string;
  method: Method;
  /** Express path below /api, e.g. "/shipments/:shipment/counts". */
  path: string;
  summary: string;
  params?: Params;
  query?: Query;
  body?: Body;
  answer: Answer;
  /** Asks for an Idempotency-Key: the same key with the same content has one effect, however often it comes. */
  keyed: boolean;
  /** "json" unless the body is a multipart form with files or the answer is a file. */
  sends: 'json' | 'files';
  answers: 'json' | 'file';
};

type Written<P extends Shape, Q extends Shape, B extends Shape, A extends Shape> = Omit<
  Operation<P, Q, B, A>,
  'keyed' | 'sends' | 'answers'
> &
  Partial<Pick<Operation<P, Q, B, A>, 'keyed' | 'sends' | 'answers'>>;

/** Writes down an operation. Posts are keyed unless they say otherwise. */
export function operation<
  P extends Shape = z.ZodUndefined,
  Q extends Shape = z.ZodUndefined,
  B extends Shape = z.ZodUndefined,
  A extends Shape = Shape,
>(written: Written<P, Q, B, A>): Operation<P, Q, B, A> {
  return { keyed: written.method !== 'GET', sends: 'json', answers: 'json', ...written };
}

export type Shaped = { params?: Shape; query?: Shape; body?: Shape; answer: Shape };
type Output<S> = S extends Shape ? z.output<S> : never;
type Input<S> = S extends Shape ? z.input<S> : never;

export type ParamsOf<O extends Shaped> = Output<NonNullable<O['params']>>;
export type QueryOf<O extends Shaped> = Output<NonNullable<O['query']>>;
export type BodyOf<O extends Shaped> = Output<NonNullable<O['body']>>;
export type AnswerOf<O extends Shaped> = Output<O['answer']>;
export type BodyInputOf<O extends Shaped> = Input<NonNullable<O['body']>>;
export type QueryInputOf<O extends Shaped> = Input<NonNullable<O['query']>>;
