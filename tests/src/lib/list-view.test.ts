import { describe, expect, it } from 'vitest';
import {
  isFiltered,
  listQueryOf,
  readListView,
  sortedBy,
  withFilter,
  withSort,
  writeListView,
  type ListSpec,
} from '../../../src/lib/list-view';

const SPEC: ListSpec<'state' | 'search'> = { filters: ['state', 'search'], sort: 'due' };
const read = (query: string) => readListView(SPEC, new URLSearchParams(query));

describe('the view of a list', () => {
  it('is the plain address when nothing is set', () => {
    expect(read('')).toEqual({ filters: { state: '', search: '' }, sort: 'due', cursor: null });
    expect(writeListView(SPEC, read('')).toString()).toBe('');
    expect(isFiltered(read(''))).toBe(false);
  });

  it.each([
    'state=filed',
    'state=filed&search=Sarn&sort=-grade&cursor=abc',
    'search=%C3%98rsk+Fell',
    'sort=-due',
  ])('comes back from its address: %s', (query) => {
    expect(writeListView(SPEC, read(query)).toString()).toBe(query);
  });

  it('passes over what the list does not have', () => {
    expect(writeListView(SPEC, read('state=filed&colour=red')).toString()).toBe('state=filed');
  });

  it('begins with the first page again when a filter or the order changes', () => {
    const third = read('cursor=abc&state=filed');
    expect(withFilter(third, 'search', 'x').cursor).toBeNull();
    expect(withSort(third, 'number').cursor).toBeNull();
  });

  it('sorts up, then down', () => {
    const once = withSort(read(''), 'number');
    expect(sortedBy(once, 'number')).toBe('ascending');
    expect(sortedBy(withSort(once, 'number'), 'number')).toBe('descending');
    expect(sortedBy(once, 'due')).toBeNull();
  });

  it('asks the API for what is set, and for nothing else', () => {
    expect(listQueryOf(read('state=filed&sort=-due'))).toEqual({ sort: '-due', 'filter[state]': 'filed' });
  });
});
