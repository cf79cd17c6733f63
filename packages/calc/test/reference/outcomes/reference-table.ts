import { readFileSync } from 'node:fs';

/** The rows of a table of exact values, by column name, made by the Python script beside it. */
export function referenceTable<Column extends string>(name: string): Record<Column, number>[] {
  const file = new URL(`./${name}.json`, import.meta.url);
  const { columns, rows } = JSON.parse(readFileSync(file, 'utf8')) as { columns: Column[]; rows: number[][] };
  return rows.map(
    (row) => Object.fromEntries(row.map((value, index) => [columns[index], value])) as Record<Column, number>,
  );
}
