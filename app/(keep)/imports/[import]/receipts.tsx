import { useLocalSearchParams } from 'expo-router';
import { ReceiptsScreen } from '@/components/imports/ReceiptsScreen';

export default function ReceiptsRoute() {
  const params = useLocalSearchParams<{ import: string }>();
  return <ReceiptsScreen id={params.import} />;
}
