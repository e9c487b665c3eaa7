import { useLocalSearchParams } from 'expo-router';
import { LetterScreen } from '@/components/mail/LetterScreen';

export default function LetterRoute() {
  const { letter } = useLocalSearchParams<{ letter: string }>();
  return <LetterScreen letter={letter} />;
}
