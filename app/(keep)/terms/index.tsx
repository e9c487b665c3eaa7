import { TermsScreen } from '@/components/terms/TermsScreen';

export default function TermsRoute() {
  return <TermsScreen />;
}
