import { readFileSync } from 'node:fs';
import { expect } from 'vitest';

/** A row by its column names. */
export type Row = Record<string, number>;

/** The rows of a table of exact values, made by the Python script beside it. */
export function referenceTable(name: string): Row[] {
  const file = new URL(`../reference/distributions/${name}.json`, import.meta.url);
  const { columns, rows } = JSON.parse(readFileSync(file, 'utf8')) as { columns: string[]; rows: number[][] };
  return rows.map((row) => Object.fromEntries(row.map((value, index) => [columns[index] ?? '', value])));
}

/** Fails with the worst row of the table where `error` is over the budget anywhere. */
export function expectWithin(budget: number, table: Row[], error: (row: Row) => number): void {
  let worst = { error: -1, row: {} as Row };
  for (const row of table) {
    const found = error(row);
    if (!(found <= worst.error)) worst = { error: found, row };
    if (Number.isNaN(found)) break;
  }
  expect(table.length).toBeGreaterThan(10);
  expect(worst.error, `worst at ${JSON.stringify(worst.row)}`).toBeLessThanOrEqual(budget);
}

export function relativeError(found: number, exact = Number.NaN): number {
  return found === exact ? 0 : Math.abs(found / exact - 1);
}
