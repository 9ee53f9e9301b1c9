import type { ReactNode } from 'react';

/**
 * One column. `cell` draws it; `sortValue` makes it sortable (null sorts last either way); `searchText` lets the search
 * look into it; `end` sets figures to the right; `rowHead` names the row and heads its card on a phone; `width` is a
 * class such as w-40 for lists over 100 rows, whose columns keep still.
 */
export type DataColumn<Row> = {
  id: string;
  header: string;
  cell: (row: Row) => ReactNode;
  sortValue?: (row: Row) => string | number | null;
  searchText?: (row: Row) => string;
  end?: boolean;
  rowHead?: boolean;
  headerHidden?: boolean;
  width?: string;
};
