import { TodayScreen } from '@/components/today/TodayScreen';

export default function TodayRoute() {
  return <TodayScreen />;
}
