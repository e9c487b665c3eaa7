import { NewTypeScreen } from '@/components/container-types/NewTypeScreen';

export default function NewTypeRoute() {
  return <NewTypeScreen />;
}
