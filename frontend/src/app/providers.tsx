import { QueryClientProvider, type QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';

import { ShortcutProvider } from '../components/shortcuts';
import { ThemeProvider } from './theme/theme-provider';

export function Providers({ queryClient, children }: { queryClient: QueryClient; children: ReactNode }) {
  return (
    <QueryClientProvider client={queryClient}>
      <ThemeProvider>
        <ShortcutProvider>{children}</ShortcutProvider>
      </ThemeProvider>
    </QueryClientProvider>
  );
}
