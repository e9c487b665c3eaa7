import { useLocalSearchParams } from 'expo-router';
import { PartnerScreen } from '@/components/partners/PartnerScreen';

export default function PartnerRoute() {
  const { partner } = useLocalSearchParams<{ partner: string }>();
  return <PartnerScreen partner={partner} />;
}
