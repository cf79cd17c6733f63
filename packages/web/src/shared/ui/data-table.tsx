import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import type { ReactNode } from 'react';
import { ScrollRegion } from './scroll-region';

const useStyles = makeStyles({
  table: { width: '100%', fontSize: '13px', lineHeight: '18px' },
  head: {
    padding: '3px 0 3px 10px',
    verticalAlign: 'bottom',
    color: tokens.colorNeutralForeground2,
    fontWeight: 400,
    ':first-child': { paddingLeft: 0 },
  },
  cell: {
    padding: '4px 0 4px 10px',
    borderTop: `1px solid ${tokens.colorNeutralStroke2}`,
    verticalAlign: 'top',
    ':first-child': { paddingLeft: 0 },
  },
  wide: { minWidth: '680px' },
  even: { tableLayout: 'fixed', '& th:first-child': { width: '30%' } },
  name: { textAlign: 'start' },
  breaking: { overflowWrap: 'anywhere' },
  number: { textAlign: 'end', whiteSpace: 'nowrap' },
  last: { fontWeight: 700 },
});

export interface Column {
  label: string;
  /** Figures stand at the end of their column and do not wrap. */
  figures?: boolean;
}

export interface Row {
  key: string;
  cells: readonly ReactNode[];
}

interface DataTableProps {
  label: string;
  columns: readonly Column[];
  rows: readonly Row[];
  /** The last row is the sum of the others. */
  totalled?: boolean;
  /** Each column after the first is as wide as the next, whatever they hold. */
  even?: boolean;
  /** Wider than a small screen: it scrolls sideways, by keyboard too. */
  scrolls?: boolean;
}

/** A plain table of figures: the first cell of a row names it. */
export function DataTable({ label, columns, rows, totalled, even, scrolls }: DataTableProps) {
  const styles = useStyles();
  const place = (column: number) =>
    columns[column]?.figures ? styles.number : mergeClasses(styles.name, !scrolls && styles.breaking);
  const table = (
    <table
      className={mergeClasses(styles.table, scrolls && styles.wide, even && styles.even)}
      aria-label={label}
    >
      <thead>
        <tr>
          {columns.map((column, index) => (
            <th key={column.label} scope="col" className={mergeClasses(styles.head, place(index))}>
              {column.label}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map(({ key, cells }, row) => (
          <tr key={key} className={totalled && row === rows.length - 1 ? styles.last : undefined}>
            {cells.map((cell, index) => {
              const Cell = index === 0 ? 'th' : 'td';
              return (
                <Cell
                  key={columns[index]?.label}
                  scope={index === 0 ? 'row' : undefined}
                  className={mergeClasses(styles.cell, place(index))}
                >
                  {cell}
                </Cell>
              );
            })}
          </tr>
        ))}
      </tbody>
    </table>
  );
  return scrolls ? <ScrollRegion label={`${label}, scrolls sideways`}>{table}</ScrollRegion> : table;
}
