import { MonthsScreen } from '@/components/months/MonthsScreen';

export default function MonthsRoute() {
  return <MonthsScreen />;
}
