import { useLocalSearchParams } from 'expo-router';
import { ImportScreen } from '@/components/imports/ImportScreen';

export default function ImportRoute() {
  const params = useLocalSearchParams<{ import: string }>();
  return <ImportScreen id={params.import} />;
}
