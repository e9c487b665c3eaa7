import { useLocalSearchParams } from 'expo-router';
import { PoolScreen } from '@/components/pool/PoolScreen';

export default function PoolRoute() {
  const { type } = useLocalSearchParams<{ type: string }>();
  return <PoolScreen type={type} />;
}
