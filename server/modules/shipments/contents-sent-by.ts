import type { CompanyKind } from '@/shared/access/abilities';

/** The operator sends empties back, a partner sends fulls in. */
export function contentsSentBy(kind: CompanyKind): 'empties' | 'fulls' {
  return kind === 'operator' ? 'empties' : 'fulls';
}
