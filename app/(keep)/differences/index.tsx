import { DifferencesScreen } from '@/components/differences/DifferencesScreen';

export default function DifferencesRoute() {
  return <DifferencesScreen />;
}
