import { ContainerTypesScreen } from '@/components/container-types/ContainerTypesScreen';

export default function ContainerTypesRoute() {
  return <ContainerTypesScreen />;
}
