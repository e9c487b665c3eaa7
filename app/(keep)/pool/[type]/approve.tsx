import { useLocalSearchParams } from 'expo-router';
import { ApproveScreen } from '@/components/pool/ApproveScreen';

export default function ApproveRoute() {
  const { type } = useLocalSearchParams<{ type: string }>();
  return <ApproveScreen type={type} />;
}
