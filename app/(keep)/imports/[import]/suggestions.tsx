import { useLocalSearchParams } from 'expo-router';
import { SuggestionsScreen } from '@/components/imports/SuggestionsScreen';

export default function SuggestionsRoute() {
  const params = useLocalSearchParams<{ import: string }>();
  return <SuggestionsScreen id={params.import} />;
}
