import type { ListSpec } from '../../../lib/list-view';

export const APPLICATION_FILTERS = ['search', 'voltage', 'state', 'grade'] as const;

export type ApplicationFilter = (typeof APPLICATION_FILTERS)[number];

/** The list as its address keeps it; what changed last stands first unless somebody sorts it. */
export const APPLICATIONS_LIST: ListSpec<ApplicationFilter> = {
  filters: APPLICATION_FILTERS,
  sort: '-updated',
};
