import type { Cell, Schematic, Sequence } from '../families/family-ui';
import { Nested } from './nested-cell';

interface ScheduleProps {
  schematic: Schematic;
  arms: readonly string[];
  hue: string;
  width: number;
  height: number;
  /** How large a cell may be at most. */
  cell?: { width: number; height: number };
}

/**
 * Sequences × periods in small: control outlined, active filled, a measurement before treatment a dot, a transition
 * struck through, no measurement a dash. Rows are as high as their share.
 */
export function Schedule(props: ScheduleProps) {
  const { schematic, arms, hue, width, height, cell: most = { width: 22, height: 13 } } = props;
  const { sequences, periods } = schematic;
  const says = `Schedule. ${scheduleInWords(schematic, arms)}`;
  const nested = sequences.some((sequence) => sequence.nested);
  const cellWidth = Math.min(nested ? 2 * most.width : most.width, (width - 2) / Math.max(1, periods.length));
  const left = (width - periods.length * cellWidth) / 2;
  const highest = highestLevel(sequences);
  return (
    <svg width={width} height={height} role="img" aria-label={says}>
      {schematic.crossed ? (
        <Crossed sequences={sequences} hue={hue} width={width} height={height} />
      ) : (
        rowsOf(sequences, height, most.height).map(({ sequence, top, rowHeight }) =>
          sequence.cells.map((cell, column) => (
            <ScheduleCell
              key={`${sequence.name} ${periods[column]}`}
              cell={cell}
              nested={sequence.nested}
              level={typeof cell === 'number' ? cell / highest : 0}
              hue={hue}
              x={left + column * cellWidth}
              y={top}
              width={cellWidth}
              height={rowHeight}
            />
          )),
        )
      )}
    </svg>
  );
}

interface CellProps {
  cell: Cell;
  nested: Sequence['nested'];
  /** How much of an active cell is filled, which tells several treatments of one sequence apart. */
  level: number;
  hue: string;
  x: number;
  y: number;
  width: number;
  height: number;
}

function ScheduleCell({ cell, nested, level, hue, x, y, width, height }: CellProps) {
  const gap = Math.min(1, width / 6, height / 6);
  const box = { x: x + gap, y: y + gap, width: width - 2 * gap, height: height - 2 * gap };
  const middle = y + height / 2;
  if (cell === 'before')
    return <circle cx={x + width - Math.min(6, width / 2)} cy={middle} r="2" fill={hue} />;
  if (cell === 'unmeasured') {
    return <line x1={x + width / 3} x2={x + (2 * width) / 3} y1={middle} y2={middle} stroke={hue} />;
  }
  if (cell === 'crossing') {
    return (
      <g stroke={hue} fill="none">
        <rect {...box} strokeDasharray="2 2" />
        <line x1={box.x} y1={box.y + box.height} x2={box.x + box.width} y2={box.y} />
      </g>
    );
  }
  if (nested) return <Nested kind={nested} active={cell > 0} hue={hue} {...box} />;
  const filled = box.height * Math.min(1, level);
  return (
    <g>
      <rect {...box} fill="none" stroke={hue} />
      {filled > 0 && <rect {...box} y={box.y + box.height - filled} height={filled} fill={hue} />}
    </g>
  );
}

/** Two treatments crossed: the first fills a cell from the lower left, the second from the upper right. */
function Crossed(props: { sequences: readonly Sequence[]; hue: string; width: number; height: number }) {
  const { sequences, hue, width, height } = props;
  const side = Math.min(22, (height - 2) / 2);
  const left = width / 2 - side;
  const top = height / 2 - side;
  return sequences.map(({ name }, index) => {
    const [x, y] = [left + (index % 2) * side + 1, top + Math.floor(index / 2) * side + 1];
    const [right, bottom] = [x + side - 2, y + side - 2];
    const first = index === 1 || index === 3;
    const second = index === 2 || index === 3;
    return (
      <g key={name} fill={hue}>
        <rect x={x} y={y} width={side - 2} height={side - 2} fill="none" stroke={hue} />
        {first && <path d={`M${x} ${y}V${bottom}H${right}Z`} />}
        {second && <path d={`M${x} ${y}H${right}V${bottom}Z`} />}
      </g>
    );
  });
}

/** Where each sequence stands, and how high. */
function rowsOf(sequences: readonly Sequence[], height: number, most: number) {
  const room = Math.min(most * sequences.length, height - 2);
  const shares = sequences.map(({ share = 1 }) => share);
  const sum = shares.reduce((total, share) => total + share, 0);
  let top = (height - room) / 2;
  return sequences.map((sequence, row) => {
    const rowHeight = (room * (shares[row] ?? 1)) / sum;
    const placed = { sequence, top, rowHeight };
    top += rowHeight;
    return placed;
  });
}

/** The last arm, where any one sequence gives several active ones; else each active arm is filled whole. */
function highestLevel(sequences: readonly Sequence[]): number {
  const active = sequences.map(({ cells }) => new Set(cells.filter((cell) => Number(cell) > 0)));
  const several = active.some((arms) => arms.size > 1);
  return several ? Math.max(...active.flatMap((arms) => [...arms].map(Number))) : 1;
}

/** “Empty: Usual care; filled 1/2: Low dose; filled: High dose”, where active arms are told apart by how far they fill. */
export function levelsInWords({ sequences }: Schematic, arms: readonly string[]): string | undefined {
  const highest = highestLevel(sequences);
  if (highest === 1) return undefined;
  const levels = arms.slice(0, highest + 1).map((arm, level) => {
    if (level === 0) return `Empty: ${arm}`;
    return `filled${level === highest ? '' : ` ${level}/${highest}`}: ${arm}`;
  });
  return levels.join('; ');
}

const untreated: Record<Exclude<Cell, number>, string> = {
  before: 'measured, untreated',
  crossing: 'crossing over, not measured',
  unmeasured: 'not measured',
};

export const cellName = (cell: Cell, arms: readonly string[]): string =>
  typeof cell === 'number' ? (arms[cell] ?? `Treatment ${cell + 1}`) : untreated[cell];

export const sequenceName = ({ name, note }: Sequence): string => (note ? `${name}, ${note}` : name);

/** “Sequence AB: Vehicle gel, then Active gel; Sequence BA: …” */
export function scheduleInWords({ sequences }: Schematic, arms: readonly string[]): string {
  const told = sequences.map((sequence) => {
    const name = sequenceName(sequence);
    const steps = runsOf(sequence.cells.map((cell) => cellName(cell, arms)));
    return steps.length === 1 && steps[0] === sequence.name ? name : `${name}: ${steps.join(', then ')}`;
  });
  return told.join('; ');
}

/** “Usual care for 2 periods”: what is the same one period after another, told once. */
function runsOf(names: readonly string[]): string[] {
  const runs: { name: string; times: number }[] = [];
  for (const name of names) {
    const last = runs.at(-1);
    if (last?.name === name) last.times += 1;
    else runs.push({ name, times: 1 });
  }
  return runs.map(({ name, times }) => (times > 1 ? `${name} for ${times} periods` : name));
}
