import { ShipmentsScreen } from '@/components/shipments/ShipmentsScreen';

export default function ShipmentsRoute() {
  return <ShipmentsScreen />;
}
