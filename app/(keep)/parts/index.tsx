import { PartsScreen } from '@/components/parts/PartsScreen';

export default function PartsRoute() {
  return <PartsScreen />;
}
