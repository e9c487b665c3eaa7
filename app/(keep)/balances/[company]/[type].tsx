import { useLocalSearchParams } from 'expo-router';
import { BalanceScreen } from '@/components/balances/BalanceScreen';

export default function BalanceRoute() {
  const { company, type } = useLocalSearchParams<{ company: string; type: string }>();
  return <BalanceScreen company={company} type={type} />;
}
