import { useLocalSearchParams } from 'expo-router';
import { NewPartScreen } from '@/components/parts/NewPartScreen';

export default function NewPartRoute() {
  const { type } = useLocalSearchParams<{ type?: string }>();
  return <NewPartScreen type={type} />;
}
