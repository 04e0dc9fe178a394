import type {
  HTMLAttributes,
  ReactNode,
  TableHTMLAttributes,
  TdHTMLAttributes,
  ThHTMLAttributes,
} from 'react';
import { classNames } from './class-names';

interface TableProps extends TableHTMLAttributes<HTMLTableElement> {
  /** Names the table for screen readers. */
  label: string;
  /** Folds into blocks on narrow screens. */
  folds?: boolean;
  /** No padding at the edges: the table stands inside a padded sheet. */
  flush?: boolean;
}

/** A dense table. All its parts carry their roles, because folded into blocks they would lose them. */
export function Table({ label, folds, flush, className, ...rest }: TableProps) {
  return (
    <table
      role="table"
      aria-label={label}
      {...rest}
      className={classNames('table', folds && 'table-folds', flush && 'table-flush', className)}
    />
  );
}

export function TableHead({ children }: { children: ReactNode }) {
  return <thead role="rowgroup">{children}</thead>;
}

export function TableBody(props: HTMLAttributes<HTMLTableSectionElement>) {
  return <tbody role="rowgroup" {...props} />;
}

interface RowProps extends HTMLAttributes<HTMLTableRowElement> {
  /** A row of filter fields under the heads. */
  filters?: boolean;
  /** Shows that the row leads somewhere. */
  selectable?: boolean;
  selected?: boolean;
}

export function Row({ filters, selectable, selected, className, ...rest }: RowProps) {
  return (
    <tr
      role="row"
      aria-selected={selected || undefined}
      {...rest}
      className={classNames(filters && 'filters', selectable && 'selectable', className)}
    />
  );
}

export type SortDirection = 'ascending' | 'descending';

interface HeadCellProps extends Omit<ThHTMLAttributes<HTMLTableCellElement>, 'aria-sort'> {
  number?: boolean;
  /** Given for a column that sorts: how it is sorted now, or null. */
  sorted?: SortDirection | null;
  onSort?: () => void;
}

/** The head of a column; pressed, it sorts. */
export function HeadCell({ number, sorted, onSort, className, children, ...rest }: HeadCellProps) {
  return (
    <th
      role="columnheader"
      scope="col"
      {...rest}
      aria-sort={onSort ? (sorted ?? 'none') : undefined}
      className={classNames(number && 'number', className)}
    >
      {onSort ? (
        <button type="button" className="sort" onClick={onSort}>
          {children}
          {sorted && (
            <svg width={8} height={7} viewBox="0 0 8 7" aria-hidden="true">
              <path d={sorted === 'ascending' ? 'M0 7 4 0 8 7Z' : 'M0 0 4 7 8 0Z'} fill="currentColor" />
            </svg>
          )}
        </button>
      ) : (
        children
      )}
    </th>
  );
}

interface CellProps extends TdHTMLAttributes<HTMLTableCellElement> {
  number?: boolean;
  oneLine?: boolean;
  /** Said before the value where the table is folded and its heads are gone. */
  foldLabel?: string;
  /** How the cell stands in a folded row: a line of its own, at the end, or left out. */
  fold?: 'row' | 'end' | 'hide';
}

const cellLooks = ({ number, oneLine, fold, className }: CellProps) =>
  classNames(number && 'number', oneLine && 'one-line', fold && `fold-${fold}`, className);

export function Cell({ number, oneLine, foldLabel, fold, className, ...rest }: CellProps) {
  return (
    <td
      role="cell"
      data-label={foldLabel}
      {...rest}
      className={cellLooks({ number, oneLine, fold, className })}
    />
  );
}

/** The cell that names its row. */
export function RowHead({ number, oneLine, foldLabel, fold, className, ...rest }: CellProps) {
  return (
    <th
      role="rowheader"
      scope="row"
      data-label={foldLabel}
      {...rest}
      className={cellLooks({ number, oneLine, fold, className })}
    />
  );
}
