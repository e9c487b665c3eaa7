import { useLocalSearchParams } from 'expo-router';
import { ContainerTypeScreen } from '@/components/container-types/ContainerTypeScreen';

export default function ContainerTypeRoute() {
  const { type } = useLocalSearchParams<{ type: string }>();
  return <ContainerTypeScreen type={type} />;
}
