import { useLocalSearchParams } from 'expo-router';
import { ChoosePasswordScreen } from '@/components/session/ChoosePasswordScreen';

export default function ChoosePasswordRoute() {
  const { token } = useLocalSearchParams<{ token?: string }>();
  return <ChoosePasswordScreen token={token} />;
}
