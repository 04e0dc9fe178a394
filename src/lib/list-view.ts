/**
 * The view of a list as its address keeps it: filters, order, page. What equals the default is left out of the
 * address, so that the plain address is the plain list.
 */
export interface ListSpec<F extends string> {
  /** Names of the filters, in the order in which the address lists them. */
  filters: readonly F[];
  /** The order of a list that nobody has sorted; descending with a minus. */
  sort: string;
}

export interface ListView<F extends string> {
  filters: Readonly<Record<F, string>>;
  sort: string;
  /** Where the page begins; null for the first. */
  cursor: string | null;
}

/** Reads a view from an address. Names that the list does not have are passed over. */
export function readListView<F extends string>(spec: ListSpec<F>, params: URLSearchParams): ListView<F> {
  const filters = Object.fromEntries(spec.filters.map((name) => [name, params.get(name)?.trim() ?? '']));
  return {
    filters: filters as Record<F, string>,
    sort: params.get('sort') || spec.sort,
    cursor: params.get('cursor') || null,
  };
}

/** Writes a view as an address; reading it gives the view again. */
export function writeListView<F extends string>(spec: ListSpec<F>, view: ListView<F>): URLSearchParams {
  const params = new URLSearchParams();
  for (const name of spec.filters) if (view.filters[name] !== '') params.set(name, view.filters[name]);
  if (view.sort !== spec.sort) params.set('sort', view.sort);
  if (view.cursor !== null) params.set('cursor', view.cursor);
  return params;
}

/** The view with one filter changed. Another list has other pages, so it begins with its first. */
export function withFilter<F extends string>(view: ListView<F>, name: F, value: string): ListView<F> {
  return { ...view, filters: { ...view.filters, [name]: value }, cursor: null };
}

/** The view sorted by a column: once up, pressed again down. */
export function withSort<F extends string>(view: ListView<F>, column: string): ListView<F> {
  return { ...view, sort: view.sort === column ? `-${column}` : column, cursor: null };
}

/** How a column is sorted in a view, for its head. */
export function sortedBy(
  view: Pick<ListView<string>, 'sort'>,
  column: string,
): 'ascending' | 'descending' | null {
  if (view.sort === column) return 'ascending';
  return view.sort === `-${column}` ? 'descending' : null;
}

/** Whether any filter is set. */
export function isFiltered(view: Pick<ListView<string>, 'filters'>): boolean {
  return Object.values(view.filters).some((value) => value !== '');
}

/** The query that the API takes: order, page, and each filter that is set as `filter[name]`. */
export function listQueryOf<F extends string>(view: ListView<F>): Record<string, string> {
  const filters = Object.entries<string>(view.filters).filter(([, value]) => value !== '');
  return {
    sort: view.sort,
    ...(view.cursor === null ? {} : { cursor: view.cursor }),
    ...Object.fromEntries(filters.map(([name, value]) => [`filter[${name}]`, value])),
  };
}
