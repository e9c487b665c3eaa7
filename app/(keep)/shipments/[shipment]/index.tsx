import { useLocalSearchParams } from 'expo-router';
import { ShipmentScreen } from '@/components/shipments/ShipmentScreen';

export default function ShipmentRoute() {
  const { shipment } = useLocalSearchParams<{ shipment: string }>();
  return <ShipmentScreen shipment={shipment} />;
}
