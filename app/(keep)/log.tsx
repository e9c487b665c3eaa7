import { LogScreen } from '@/components/log/LogScreen';

export default function LogRoute() {
  return <LogScreen />;
}
