import { randomUUID } from 'node:crypto';
import type { Express } from 'express';
import request, { type Agent, type Response, type Test } from 'supertest';
import { testPassword } from './builders';

type Sent = { key?: string; query?: Record<string, string>; headers?: Record<string, string> };

/** A browser's worth of session: cookie, token, and a fresh key for each changing request unless one is given. */
export class Caller {
  private constructor(
    private readonly agent: ReturnType<typeof request.agent>,
    public token: string,
  ) {}

  static async stranger(app: Express | string): Promise<Caller> {
    const agent = request.agent(app);
    const response = await agent.get('/api/session');
    return new Caller(agent, String(response.body.csrfToken));
  }

  static async signedIn(app: Express | string, email: string, password = testPassword): Promise<Caller> {
    const caller = await Caller.stranger(app);
    const response = await caller.post('/session', { email, password });
    if (response.status !== 200)
      throw new Error(`sign-in of ${email} answered ${response.status} ${response.text}`);
    caller.token = String(response.body.csrfToken);
    return caller;
  }

  get(path: string, query: Record<string, string> = {}): Test {
    return this.agent.get(`/api${path}`).query(query);
  }

  post(path: string, body: unknown = {}, sent: Sent = {}): Test {
    return this.prepared(this.agent.post(`/api${path}`), sent).send(body as object);
  }

  put(path: string, body: unknown = {}, sent: Sent = {}): Test {
    return this.prepared(this.agent.put(`/api${path}`), sent).send(body as object);
  }

  delete(path: string, sent: Sent = {}): Test {
    return this.prepared(this.agent.delete(`/api${path}`), sent);
  }

  /** A multipart form; attach files to what it returns. */
  form(path: string, sent: Sent = {}): Test {
    return this.prepared(this.agent.post(`/api${path}`), sent);
  }

  private prepared(test: Test, sent: Sent): Test {
    test.set('x-csrf-token', this.token).set('idempotency-key', sent.key ?? randomUUID());
    for (const [name, value] of Object.entries(sent.headers ?? {})) test.set(name, value);
    return test.query(sent.query ?? {});
  }
}

export type { Agent, Response };
