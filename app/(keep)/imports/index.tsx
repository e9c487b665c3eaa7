import { ImportsScreen } from '@/components/imports/ImportsScreen';

export default function ImportsRoute() {
  return <ImportsScreen />;
}
