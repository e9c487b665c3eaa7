import { useLocalSearchParams } from 'expo-router';
import { ImportShipmentsScreen } from '@/components/imports/ImportShipmentsScreen';

export default function ImportShipmentsRoute() {
  const params = useLocalSearchParams<{ import: string }>();
  return <ImportShipmentsScreen id={params.import} />;
}
