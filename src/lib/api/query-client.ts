import { QueryClient } from '@tanstack/react-query';
import { ApiProblem } from './problem';

/** What the server refused, it refuses again; only a lost connection or a failing server is tried again. */
function shouldRetry(failures: number, error: Error): boolean {
  if (error instanceof ApiProblem && error.status < 500) return false;
  return failures < 2;
}

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { retry: shouldRetry, staleTime: 15_000, refetchOnWindowFocus: true },
      mutations: { retry: false },
    },
  });
}
