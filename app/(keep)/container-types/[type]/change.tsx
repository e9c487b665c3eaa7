import { useLocalSearchParams } from 'expo-router';
import { ChangeTypeScreen } from '@/components/container-types/ChangeTypeScreen';

export default function ChangeTypeRoute() {
  const { type } = useLocalSearchParams<{ type: string }>();
  return <ChangeTypeScreen type={type} />;
}
