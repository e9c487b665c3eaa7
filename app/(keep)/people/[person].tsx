import { useLocalSearchParams } from 'expo-router';
import { PersonScreen } from '@/components/people/PersonScreen';

export default function PersonRoute() {
  const { person } = useLocalSearchParams<{ person: string }>();
  return <PersonScreen person={person} />;
}
