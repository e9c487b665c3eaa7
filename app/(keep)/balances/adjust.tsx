import { AdjustScreen } from '@/components/balances/AdjustScreen';

export default function AdjustRoute() {
  return <AdjustScreen />;
}
