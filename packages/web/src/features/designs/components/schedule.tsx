import type { Cell, Schematic } from '../families/family-ui';

interface ScheduleProps {
  schematic: Schematic;
  arms: readonly string[];
  hue: string;
  width: number;
  height: number;
}

/** Sequences × periods in small: control outlined, active filled, a measurement before treatment a dot. */
export function Schedule({ schematic, arms, hue, width, height }: ScheduleProps) {
  const { sequences, periods } = schematic;
  const cellWidth = Math.min(22, (width - 2) / Math.max(1, periods.length));
  const cellHeight = Math.min(13, (height - 2) / Math.max(1, sequences.length));
  const left = (width - periods.length * cellWidth) / 2;
  const top = (height - sequences.length * cellHeight) / 2;
  return (
    <svg
      width={width}
      height={height}
      role="img"
      aria-label={`Schedule. ${scheduleInWords(schematic, arms)}`}
    >
      {sequences.flatMap(({ name, cells }, row) =>
        cells.map((cell, column) => {
          const key = `${name} ${periods[column]}`;
          const x = left + column * cellWidth;
          const y = top + row * cellHeight;
          return cell === 'before' ? (
            <circle key={key} cx={x + cellWidth - 6} cy={y + cellHeight / 2} r="2" fill={hue} />
          ) : (
            <rect
              key={key}
              x={x + 1}
              y={y + 1}
              width={cellWidth - 2}
              height={cellHeight - 2}
              fill={cell > 0 ? hue : 'none'}
              stroke={hue}
            />
          );
        }),
      )}
    </svg>
  );
}

export const cellName = (cell: Cell, arms: readonly string[]): string =>
  cell === 'before' ? 'measured, untreated' : (arms[cell] ?? `Treatment ${cell + 1}`);

/** “Sequence AB: Vehicle gel, then Active gel; Sequence BA: …” */
export function scheduleInWords({ sequences }: Schematic, arms: readonly string[]): string {
  const told = sequences.map(({ name, cells }) => {
    const steps = cells.map((cell) => cellName(cell, arms));
    return steps.length === 1 && steps[0] === name ? name : `${name}: ${steps.join(', then ')}`;
  });
  return told.join('; ');
}
