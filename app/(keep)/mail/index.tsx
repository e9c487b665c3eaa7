import { MailScreen } from '@/components/mail/MailScreen';

export default function MailRoute() {
  return <MailScreen />;
}
