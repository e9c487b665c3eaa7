import { useLocalSearchParams } from 'expo-router';
import { StatementScreen } from '@/components/statements/StatementScreen';

export default function StatementRoute() {
  const { statement } = useLocalSearchParams<{ statement: string }>();
  return <StatementScreen key={statement} statement={statement} />;
}
