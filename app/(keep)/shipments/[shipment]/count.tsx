import { useLocalSearchParams } from 'expo-router';
import { CountScreen } from '@/components/shipments/CountScreen';

export default function CountRoute() {
  const { shipment } = useLocalSearchParams<{ shipment: string }>();
  return <CountScreen key={shipment} shipment={shipment} />;
}
