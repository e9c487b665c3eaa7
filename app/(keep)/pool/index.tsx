import { PoolListScreen } from '@/components/pool/PoolListScreen';

export default function PoolListRoute() {
  return <PoolListScreen />;
}
