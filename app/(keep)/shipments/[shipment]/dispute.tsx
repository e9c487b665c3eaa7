import { useLocalSearchParams } from 'expo-router';
import { DisputeCountScreen } from '@/components/disputes/DisputeCountScreen';

export default function DisputeCountRoute() {
  const { shipment, type } = useLocalSearchParams<{ shipment: string; type?: string }>();
  return <DisputeCountScreen shipment={shipment} {...(type ? { type } : {})} />;
}
