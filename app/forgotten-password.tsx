import { ForgottenPasswordScreen } from '@/components/session/ForgottenPasswordScreen';

export default ForgottenPasswordScreen;
