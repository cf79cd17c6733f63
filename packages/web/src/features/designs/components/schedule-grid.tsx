import { Button, makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { AddRegular, DismissRegular } from '@fluentui/react-icons';
import { type KeyboardEvent, useRef, useState } from 'react';
import { useController } from 'react-hook-form';
import { ScrollRegion } from '../../../shared/ui/scroll-region';
import { type ScheduleCell, scheduleOf } from '../families/cluster-schedule';
import { mostPeriods } from '../families/periods';
import { listMessage } from './list-error';
import { cellName } from './schedule';
import { type PartProps, structurePath } from './structure-props';

const useStyles = makeStyles({
  fields: { padding: 0, margin: 0, border: 'none', minWidth: 0 },
  legend: { padding: 0, fontWeight: 700, marginBottom: '4px' },
  told: { color: tokens.colorNeutralForeground2, fontSize: '13px', lineHeight: '18px' },
  fault: { color: tokens.colorStatusDangerForeground1, fontSize: '13px', lineHeight: '18px' },
  cells: { borderCollapse: 'separate', borderSpacing: '3px', margin: '4px 0' },
  head: { fontSize: '13px', fontWeight: 400, color: tokens.colorNeutralForeground2 },
  cell: {
    display: 'block',
    width: '32px',
    height: '28px',
    padding: 0,
    border: `1px solid ${tokens.colorNeutralForeground1}`,
    borderRadius: '3px',
    backgroundColor: tokens.colorNeutralBackground1,
    color: tokens.colorNeutralForeground1,
    font: 'inherit',
    cursor: 'pointer',
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '1px' },
  },
  active: { backgroundColor: tokens.colorNeutralForeground1, color: tokens.colorNeutralBackground1 },
  unmeasured: { border: `1px dashed ${tokens.colorNeutralStroke1}` },
  remove: { minWidth: '32px', maxWidth: '32px' },
  adds: { display: 'flex', flexWrap: 'wrap', gap: '6px' },
});

const steps: Record<string, [down: number, right: number]> = {
  ArrowUp: [-1, 0],
  ArrowDown: [1, 0],
  ArrowLeft: [0, -1],
  ArrowRight: [0, 1],
};

const placeOf = (row: number, column: number) => `${row} ${column}`;

/** From control to active to not measured, and round again. */
function turned(cell: ScheduleCell): ScheduleCell {
  if (cell === null) return 0;
  return cell === 0 ? 1 : null;
}

/** Sequences × periods to draw up, cell by cell; one cell is in the order of tabs, arrow keys reach the others. */
export function ScheduleGrid({ form, words: { arms, clusters } }: PartProps<'schedule'>) {
  const styles = useStyles();
  const { field, fieldState } = useController({ control: form.control, name: structurePath('schedule') });
  const table = useRef<HTMLTableElement>(null);
  const [at, setAt] = useState([0, 0]);
  const rows = scheduleOf({ schedule: field.value as unknown });
  const periods = (rows[0] ?? []).map((_, period) => `Period ${period + 1}`);
  const tabbed = placeOf(Math.min(at[0] ?? 0, rows.length - 1), Math.min(at[1] ?? 0, periods.length - 1));
  const fault = listMessage(fieldState.error);
  const set = (next: ScheduleCell[][]) => field.onChange(next);

  const turn = (row: number, column: number) =>
    set(rows.map((cells, r) => cells.map((cell, c) => (r === row && c === column ? turned(cell) : cell))));

  const move = (event: KeyboardEvent, row: number, column: number) => {
    const step = steps[event.key];
    if (!step) return;
    event.preventDefault();
    const next = placeOf(row + step[0], column + step[1]);
    table.current?.querySelector<HTMLElement>(`[data-place="${next}"]`)?.focus();
  };

  return (
    <fieldset className={styles.fields}>
      <legend className={styles.legend}>Schedule</legend>
      <p className={styles.told}>
        What the {clusters.many} of each sequence receive, period by period. Press a cell to change it: empty
        is {arms[0]}, filled {arms[1]}, a dash not measured. Arrow keys move between cells.
      </p>
      <ScrollRegion label="Schedule to draw up, scrolls sideways">
        <table ref={table} className={styles.cells} aria-label="Schedule to draw up">
          <thead>
            <tr>
              <td />
              {periods.map((period, column) => (
                <th key={period} scope="col" aria-label={period} className={styles.head}>
                  {column + 1}
                </th>
              ))}
              <td />
            </tr>
          </thead>
          <tbody>
            {rows.map((cells, row) => {
              const sequence = `Sequence ${row + 1}`;
              return (
                <tr key={sequence}>
                  <th scope="row" aria-label={sequence} className={styles.head}>
                    {row + 1}
                  </th>
                  {cells.map((cell, column) => (
                    <td key={periods[column]}>
                      <button
                        type="button"
                        data-place={placeOf(row, column)}
                        tabIndex={placeOf(row, column) === tabbed ? 0 : -1}
                        aria-label={`${sequence}, period ${column + 1}: ${cellName(cell ?? 'unmeasured', arms)}`}
                        className={mergeClasses(
                          styles.cell,
                          cell === 1 && styles.active,
                          cell === null && styles.unmeasured,
                        )}
                        onClick={() => turn(row, column)}
                        onKeyDown={(event) => move(event, row, column)}
                        onFocus={() => setAt([row, column])}
                      >
                        {cell === null ? '–' : ''}
                      </button>
                    </td>
                  ))}
                  <td>
                    {rows.length > 2 && (
                      <Remove what={sequence} onRemove={() => set(rows.toSpliced(row, 1))} />
                    )}
                  </td>
                </tr>
              );
            })}
            {periods.length > 1 && (
              <tr>
                <td />
                {periods.map((period, column) => (
                  <td key={period}>
                    <Remove
                      what={period}
                      onRemove={() => set(rows.map((cells) => cells.toSpliced(column, 1)))}
                    />
                  </td>
                ))}
              </tr>
            )}
          </tbody>
        </table>
      </ScrollRegion>
      <div className={styles.adds}>
        {rows.length < mostPeriods && (
          <Button
            size="small"
            icon={<AddRegular />}
            onClick={() => set([...rows, [...(rows.at(-1) ?? [0])]])}
          >
            Add a sequence
          </Button>
        )}
        {periods.length < mostPeriods && (
          <Button
            size="small"
            icon={<AddRegular />}
            onClick={() => set(rows.map((cells) => [...cells, cells.at(-1) ?? 0]))}
          >
            Add a period
          </Button>
        )}
      </div>
      {fault && (
        <p role="alert" className={styles.fault}>
          {fault}
        </p>
      )}
    </fieldset>
  );
}

function Remove({ what, onRemove }: { what: string; onRemove: () => void }) {
  const styles = useStyles();
  return (
    <Button
      size="small"
      appearance="subtle"
      icon={<DismissRegular />}
      aria-label={`Remove ${what.toLocaleLowerCase('en-GB')}`}
      className={styles.remove}
      onClick={onRemove}
    />
  );
}
