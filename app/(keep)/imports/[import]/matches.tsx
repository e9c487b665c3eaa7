import { useLocalSearchParams } from 'expo-router';
import { MatchesScreen } from '@/components/imports/MatchesScreen';

export default function MatchesRoute() {
  const params = useLocalSearchParams<{ import: string }>();
  return <MatchesScreen id={params.import} />;
}
