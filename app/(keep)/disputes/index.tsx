import { DisputesScreen } from '@/components/disputes/DisputesScreen';

export default function DisputesRoute() {
  return <DisputesScreen />;
}
