import { useLocalSearchParams } from 'expo-router';
import { SignInScreen } from '@/components/session/SignInScreen';

export default function SignInRoute() {
  const { to } = useLocalSearchParams<{ to?: string }>();
  return <SignInScreen to={to} />;
}
