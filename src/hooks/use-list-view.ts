import { useSearchParams } from 'react-router-dom';
import {
  readListView,
  withFilter,
  withSort,
  writeListView,
  type ListSpec,
  type ListView,
} from '../lib/list-view';

export interface ListControls<F extends string> {
  view: ListView<F>;
  setFilter: (name: F, value: string) => void;
  /** Sorts by a column, the other way round when it is sorted so already. */
  setSort: (column: string) => void;
  /** Takes an order as it is written, such as `-due`. */
  sortBy: (sort: string) => void;
  /** The address of this view from another page's cursor on, or of its first page. */
  pageHref: (cursor: string | null) => string;
  clear: () => void;
}

/** The view that the address holds, and what changes it. A change of filter takes no step in the history. */
export function useListView<F extends string>(spec: ListSpec<F>): ListControls<F> {
  const [params, setParams] = useSearchParams();
  const view = readListView(spec, params);
  const show = (next: ListView<F>) => setParams(writeListView(spec, next), { replace: true });
  return {
    view,
    setFilter: (name, value) => show(withFilter(view, name, value)),
    setSort: (column) => show(withSort(view, column)),
    sortBy: (sort) => show({ ...view, sort, cursor: null }),
    pageHref: (cursor) => `?${writeListView(spec, { ...view, cursor })}`,
    clear: () => setParams(new URLSearchParams(), { replace: true }),
  };
}
