import { useLocalSearchParams } from 'expo-router';
import { DifferencesScreen } from '@/components/differences/DifferencesScreen';

export default function DifferenceRoute() {
  const { difference } = useLocalSearchParams<{ difference: string }>();
  return <DifferencesScreen chosen={difference} />;
}
