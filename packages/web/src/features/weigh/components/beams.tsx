import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { type KeyboardEvent, useRef } from 'react';
import { money } from '../../../shared/format/money';
import { count } from '../../../shared/format/numbers';
import { Word } from '../../../shared/ui/words';
import { beamScale } from '../model/beams';
import type { Weighing } from '../model/weighing';
import { BeamRow } from './beam-row';

const narrow = '@media (max-width: 640px)';

const useStyles = makeStyles({
  table: { width: '100%', tableLayout: 'fixed', [narrow]: { display: 'block' } },
  heads: { [narrow]: { display: 'none' } },
  head: {
    padding: '6px',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '20px',
    whiteSpace: 'nowrap',
    ':first-child': { paddingLeft: '14px' },
    ':last-child': { paddingRight: '14px' },
  },
  option: { width: '26%' },
  schedule: { width: '78px' },
  scaled: { display: 'flex', justifyContent: 'space-between', gap: '8px' },
  figure: { width: '68px', textAlign: 'end' },
  standing: { width: '22%', paddingLeft: '16px' },
  rows: { [narrow]: { display: 'block' } },
});

interface BeamsProps {
  weighing: Weighing;
  selected: string | undefined;
  onSelect: (optionId: string) => void;
}

/** The options as rows, each with its beam; arrow keys go from row to row, Enter or the space bar chooses one. */
export function Beams({ weighing, selected, onSelect }: BeamsProps) {
  const styles = useStyles();
  const { options, currency, limits } = weighing;
  const rows = useRef<HTMLTableSectionElement>(null);
  const scale = beamScale(options, limits.limits.money);

  const onKeyDown = (event: KeyboardEvent) => {
    const choices = [...(rows.current?.querySelectorAll<HTMLElement>('button[aria-pressed]') ?? [])];
    const here = choices.indexOf(event.target as HTMLElement);
    const next = here < 0 ? undefined : choices[rowAfter(event.key, here, choices.length - 1)];
    if (!next) return;
    next.focus();
    event.preventDefault();
  };

  return (
    <table className={styles.table} aria-label="Options">
      <thead className={styles.heads}>
        <tr>
          <th className={mergeClasses(styles.head, styles.option)}>
            <Word is="option">Option</Word>
          </th>
          <th className={mergeClasses(styles.head, styles.schedule)}>Schedule</th>
          <th className={styles.head}>
            <div className={styles.scaled}>
              <Word is="beam">Cost by arm</Word>
              {scale > 0 && <span>0 to {scale < 10_000 ? count(scale) : money(scale, currency)}</span>}
            </div>
          </th>
          <th className={mergeClasses(styles.head, styles.figure)}>Power</th>
          <th className={mergeClasses(styles.head, styles.figure)}>Cost</th>
          <th className={mergeClasses(styles.head, styles.figure)}>Months</th>
          <th className={mergeClasses(styles.head, styles.standing)}>Against the limits</th>
        </tr>
      </thead>
      <tbody ref={rows} className={styles.rows} onKeyDown={onKeyDown}>
        {options.map((option) => (
          <BeamRow
            key={option.id}
            option={option}
            scale={scale}
            weighing={weighing}
            selected={option.id === selected}
            onSelect={() => onSelect(option.id)}
          />
        ))}
      </tbody>
    </table>
  );
}

/** The row that a key leads to; −1 for a key that leads nowhere. */
function rowAfter(key: string, row: number, last: number): number {
  switch (key) {
    case 'ArrowDown':
      return Math.min(last, row + 1);
    case 'ArrowUp':
      return Math.max(0, row - 1);
    case 'Home':
      return 0;
    case 'End':
      return last;
    default:
      return -1;
  }
}
