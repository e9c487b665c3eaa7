import { useLocalSearchParams } from 'expo-router';
import { StatementMovementsScreen } from '@/components/statements/StatementMovementsScreen';

export default function StatementMovementsRoute() {
  const { statement } = useLocalSearchParams<{ statement: string }>();
  return <StatementMovementsScreen statement={statement} />;
}
