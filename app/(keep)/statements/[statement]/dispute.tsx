import { useLocalSearchParams } from 'expo-router';
import { DisputeLineScreen } from '@/components/disputes/DisputeLineScreen';

export default function DisputeLineRoute() {
  const { statement, line } = useLocalSearchParams<{ statement: string; line: string }>();
  return <DisputeLineScreen statement={statement} line={line} />;
}
