import { SendScreen } from '@/components/shipments/SendScreen';

export default function SendRoute() {
  return <SendScreen />;
}
