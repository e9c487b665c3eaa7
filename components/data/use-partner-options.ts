import { listPartners } from '@/shared/contracts/partners';
import { useRead } from './use-operation';
import { useSignedIn } from './use-session';

/** The partners that the operator can narrow a list to; null for a partner, which sees its own rows alone. */
export function usePartnerOptions(): { value: string; label: string }[] | null {
  const isOperator = useSignedIn().company.kind === 'operator';
  const { data } = useRead(listPartners, { query: { kind: 'partner', limit: 200 }, enabled: isOperator });
  return isOperator ? (data?.rows ?? []).map(({ id, name }) => ({ value: id, label: name })) : null;
}
