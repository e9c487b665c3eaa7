import { useLocalSearchParams } from 'expo-router';
import { MonthScreen } from '@/components/months/MonthScreen';

export default function MonthRoute() {
  const { month } = useLocalSearchParams<{ month: string }>();
  return <MonthScreen key={month} month={month} />;
}
