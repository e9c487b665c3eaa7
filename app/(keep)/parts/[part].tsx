import { useLocalSearchParams } from 'expo-router';
import { ChangePartScreen } from '@/components/parts/ChangePartScreen';

export default function ChangePartRoute() {
  const { part } = useLocalSearchParams<{ part: string }>();
  return <ChangePartScreen part={part} />;
}
