import { NewPartnerScreen } from '@/components/partners/NewPartnerScreen';

export default function NewPartnerRoute() {
  return <NewPartnerScreen />;
}
