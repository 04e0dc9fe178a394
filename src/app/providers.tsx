import { QueryClientProvider, type QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';

interface ProvidersProps {
  queryClient: QueryClient;
  children: ReactNode;
}

/** What every page stands in. */
export function Providers({ queryClient, children }: ProvidersProps) {
  return <QueryClientProvider client={queryClient}>{children}</QueryClientProvider>;
}
