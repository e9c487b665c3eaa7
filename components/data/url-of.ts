import type { Operation } from '@/shared/contracts/operation';

type Address = { params?: unknown; query?: unknown };

/** Address of an operation below /api, its parameters filled in and encoded. Also for download links. */
export function urlOf(operation: Pick<Operation, 'path'>, { params, query }: Address = {}): string {
  const values = (params ?? {}) as Record<string, unknown>;
  const path = operation.path.replace(/:([a-zA-Z]+)/g, (_, name: string) =>
    encodeURIComponent(String(values[name])),
  );
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries((query ?? {}) as Record<string, unknown>)) {
    if (value !== undefined && value !== null && value !== '') search.set(name, String(value));
  }
  const written = search.toString();
  return `/api${path}${written === '' ? '' : `?${written}`}`;
}
