import { useLocalSearchParams } from 'expo-router';
import { PartnerTermsScreen } from '@/components/terms/PartnerTermsScreen';

export default function PartnerTermsRoute() {
  const { partner } = useLocalSearchParams<{ partner: string }>();
  return <PartnerTermsScreen key={partner} partner={partner} />;
}
