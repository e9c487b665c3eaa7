import { useLocalSearchParams } from 'expo-router';
import { LoopScreen } from '@/components/pool/LoopScreen';

export default function LoopRoute() {
  const { type } = useLocalSearchParams<{ type: string }>();
  return <LoopScreen type={type} />;
}
