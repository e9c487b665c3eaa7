import { InviteScreen } from '@/components/people/InviteScreen';

export default function InviteRoute() {
  return <InviteScreen />;
}
