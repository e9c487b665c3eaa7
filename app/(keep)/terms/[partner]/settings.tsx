import { useLocalSearchParams } from 'expo-router';
import { SettingsScreen } from '@/components/terms/SettingsScreen';

export default function PartnerSettingsRoute() {
  const { partner } = useLocalSearchParams<{ partner: string }>();
  return <SettingsScreen key={partner} partner={partner} />;
}
