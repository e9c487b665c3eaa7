import { useLocalSearchParams } from 'expo-router';
import { DisputesScreen } from '@/components/disputes/DisputesScreen';

export default function DisputeRoute() {
  const { dispute } = useLocalSearchParams<{ dispute: string }>();
  return <DisputesScreen chosen={dispute} />;
}
