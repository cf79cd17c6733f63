import type { Locator, Page } from '@playwright/test';

export interface Shown {
  name: string;
  analysed: number;
  recruited: number;
  power: number;
  money: number;
  months: number;
  byArm: string;
}

/** The card of beams, which can also be read as a table. */
export const beamsCard = (page: Page): Locator => page.getByRole('region', { name: 'Options side by side' });

/** The options' figures as the table on Weigh shows them; the table must have been asked for. */
export async function figuresShown(page: Page): Promise<Shown[]> {
  const table = page.getByRole('table', { name: 'Options as a table' });
  const columns = await table.getByRole('columnheader').allInnerTexts();
  const rows = table.getByRole('row').filter({ hasNot: page.getByRole('columnheader') });
  const shown: Shown[] = [];
  for (const row of await rows.all()) {
    const cells = await row.getByRole('rowheader').or(row.getByRole('cell')).allInnerTexts();
    const text = (column: string) => cells[columns.indexOf(column)] ?? '';
    const number = (column: string) => Number(text(column).replace(/[^\d.]/g, ''));
    shown.push({
      name: text('Option'),
      analysed: number('Analysed'),
      recruited: number('Recruited'),
      power: number('Power'),
      money: number('Cost'),
      months: number('Months'),
      byArm: text('Cost by arm').replaceAll('\u00a0', ' '),
    });
  }
  return shown;
}
