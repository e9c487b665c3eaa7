import { BalancesScreen } from '@/components/balances/BalancesScreen';

export default function BalancesRoute() {
  return <BalancesScreen />;
}
