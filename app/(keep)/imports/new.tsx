import { NewImportScreen } from '@/components/imports/NewImportScreen';

export default function NewImportRoute() {
  return <NewImportScreen />;
}
