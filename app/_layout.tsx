import '@/components/theme/fonts.css';
import '@/components/theme/colours.css';
import '@/components/theme/base.css';
import '@/components/ui/ui.css';
import { QueryClientProvider } from '@tanstack/react-query';
import { Slot } from 'expo-router';
import { useState } from 'react';
import { makeQueryClient } from '@/components/data/query-client';
import { BrokenPage } from '@/components/shell/BrokenPage';

export function ErrorBoundary() {
  return <BrokenPage onReload={() => window.location.reload()} />;
}

export default function RootLayout() {
  const [client] = useState(makeQueryClient);
  return (
    <QueryClientProvider client={client}>
      <Slot />
    </QueryClientProvider>
  );
}
