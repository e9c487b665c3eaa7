import '@/components/theme/fonts.css';
import '@/components/theme/colours.css';
import '@/components/theme/base.css';
import '@/components/ui/fields.css';
import '@/components/ui/sheet.css';
import '@/components/ui/frame.css';
import { Slot } from 'expo-router';
import { QueryProvider } from '@/components/data/QueryProvider';
import { BrokenPage } from '@/components/shell/BrokenPage';

export function ErrorBoundary() {
  return <BrokenPage onReload={() => window.location.reload()} />;
}

export default function RootLayout() {
  return (
    <QueryProvider>
      <Slot />
    </QueryProvider>
  );
}
