import { PartnersScreen } from '@/components/partners/PartnersScreen';

export default function PartnersRoute() {
  return <PartnersScreen />;
}
