import type { QueryClient } from '@tanstack/react-query';
import { RulesPage } from '../../features/rules/components/rules-page';
import { rulesQuery } from '../../lib/queries/get-rules';

export const prefetch = (client: QueryClient) => client.prefetchQuery(rulesQuery());

export const Component = RulesPage;
