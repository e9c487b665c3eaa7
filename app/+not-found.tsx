import { NotFoundScreen } from '@/components/shell/NotFoundScreen';

export default NotFoundScreen;
