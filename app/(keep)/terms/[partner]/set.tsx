import { useLocalSearchParams } from 'expo-router';
import { SetTermsScreen } from '@/components/terms/SetTermsScreen';

export default function SetTermsRoute() {
  const { partner, type } = useLocalSearchParams<{ partner: string; type?: string }>();
  return <SetTermsScreen key={partner} partner={partner} {...(type ? { type } : {})} />;
}
