import { AccountScreen } from '@/components/session/AccountScreen';

export default AccountScreen;
