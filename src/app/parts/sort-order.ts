import type { ListParts } from '@shared/contracts/parts';

export type SortOrder = NonNullable<ListParts['sort']>;

export const NEWEST_FIRST: SortOrder = '-changed';
export const SORT_ORDERS: readonly SortOrder[] = ['number', '-number', 'changed', '-changed', 'title', '-title'];

/** From the address bar; anything else means newest first. */
export const sortFrom = (text: string | undefined): SortOrder =>
  SORT_ORDERS.find((order) => order === text) ?? NEWEST_FIRST;

export const SORT_WORDS: Readonly<Record<SortOrder, string>> = {
  '-changed': 'Changed, newest first',
  changed: 'Changed, oldest first',
  number: 'Number, ascending',
  '-number': 'Number, descending',
  title: 'Title, A to Z',
  '-title': 'Title, Z to A',
};
