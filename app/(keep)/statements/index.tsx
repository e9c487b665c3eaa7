import { StatementsScreen } from '@/components/statements/StatementsScreen';

export default function StatementsRoute() {
  return <StatementsScreen />;
}
