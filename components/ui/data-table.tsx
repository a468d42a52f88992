import type { ReactNode } from 'react';
import { classNames } from './class-names';

export type Column<Row> = {
  key: string;
  head: ReactNode;
  cell: (row: Row) => ReactNode;
  /** Right-aligned figures. */
  numeric?: boolean;
  /** The cell that names its row. */
  rowHead?: boolean;
  /** Left out below this width of the screen; only for what stands one step away too. */
  from?: 'sm' | 'md' | 'lg';
};

const FROM = { sm: 'from-sm', md: 'from-md', lg: 'from-lg' } as const;

/** A real table that scrolls within itself when the screen is narrower than it is. */
export function DataTable<Row>({
  caption,
  hideCaption = false,
  columns,
  rows,
  rowKey,
  empty,
  foot,
}: {
  caption: string;
  hideCaption?: boolean;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  /** What to say when there is no row. */
  empty?: ReactNode;
  foot?: ReactNode;
}) {
  const cellClass = (column: Column<Row>) =>
    classNames(column.numeric ? 'numeric' : null, column.from ? FROM[column.from] : null);
  return (
    <div className="table-scroll" role="region" aria-label={caption} tabIndex={0}>
      <table className="data-table">
        <caption className={hideCaption ? 'sr-only' : undefined}>{caption}</caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <th key={column.key} scope="col" className={cellClass(column)}>
                {column.head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)}>
              {columns.map((column) =>
                column.rowHead ? (
                  <th key={column.key} scope="row" className={cellClass(column)}>
                    {column.cell(row)}
                  </th>
                ) : (
                  <td key={column.key} className={cellClass(column)}>
                    {column.cell(row)}
                  </td>
                ),
              )}
            </tr>
          ))}
          {rows.length === 0 && empty ? (
            <tr>
              <td colSpan={columns.length} className="table-empty">
                {empty}
              </td>
            </tr>
          ) : null}
        </tbody>
        {foot ? <tfoot>{foot}</tfoot> : null}
      </table>
    </div>
  );
}
