import { MoreScreen } from '@/components/shell/MoreScreen';

export default MoreScreen;
