import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { keyOf } from '@/components/data/use-operation';
import { readSession } from '@/shared/contracts/session';

export const signedIn = {
  person: {
    id: '0b7c1c1e-6d1f-4d07-9d3a-1f0d0c6f7a01',
    name: 'Ane Ravn',
    email: 'ane@fennmark.example',
    roles: ['coordinator'],
    language: 'en',
  },
  company: {
    id: '0b7c1c1e-6d1f-4d07-9d3a-1f0d0c6f7a02',
    name: 'Fennmark Heat Pumps',
    kind: 'operator',
    currency: 'EUR',
    timeZone: 'Europe/Copenhagen',
  },
  abilities: ['see own account'],
  waiting: {},
};

/** The app around a part of it, with the coordinator signed in. */
export function App({ children }: { children: ReactNode }) {
  const [client] = useState(() => {
    const made = new QueryClient({ defaultOptions: { queries: { staleTime: Infinity, retry: false } } });
    made.setQueryData(keyOf(readSession), sessionReply.body);
    return made;
  });
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}

type Reply = { status?: number; body: unknown };
type Server = (request: { method: string; path: string; body: unknown; headers: Headers }) => Reply;

/** A server in place of fetch; gives back every request it was sent. */
export function serveWith(server: Server) {
  const requests: Parameters<Server>[0][] = [];
  globalThis.fetch = (async (url: string, init: RequestInit = {}) => {
    const request = {
      method: init.method ?? 'GET',
      path: url,
      body: typeof init.body === 'string' ? (JSON.parse(init.body) as unknown) : undefined,
      headers: new Headers(init.headers),
    };
    requests.push(request);
    const { status = 200, body } = server(request);
    return { ok: status < 400, status, json: async () => body } as Response;
  }) as typeof fetch;
  return requests;
}

export const sessionReply = { body: { csrfToken: 'token-1', signedIn } };

/** jsdom has no layout: this is how wide the window says it is. */
export function widthOf(width: number) {
  Object.defineProperty(document.documentElement, 'clientWidth', { configurable: true, value: width });
  Object.defineProperty(window, 'innerWidth', { configurable: true, value: width });
  window.dispatchEvent(new Event('resize'));
}
