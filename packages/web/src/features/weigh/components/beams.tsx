import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { type KeyboardEvent, useRef } from 'react';
import { Word } from '../../../shared/ui/words';
import { sizeOf } from '../model/against';
import type { Measure } from '../model/beam-measures';
import type { Weighed, Weighing } from '../model/weighing';
import { BeamRow } from './beam-row';
import { HeadSelect } from './head-select';
import { narrow } from './row-styles';
import { useWeighView } from './use-weigh-view';

const useStyles = makeStyles({
  table: { width: '100%', tableLayout: 'fixed', [narrow]: { display: 'block' } },
  heads: { [narrow]: { display: 'block' } },
  headRow: {
    [narrow]: { display: 'flex', flexWrap: 'wrap', justifyContent: 'space-between', padding: '2px 12px' },
  },
  plain: { [narrow]: { display: 'none' } },
  head: {
    padding: '6px',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '20px',
    whiteSpace: 'nowrap',
    ':first-child': { paddingLeft: '14px' },
    ':last-child': { paddingRight: '14px' },
    [narrow]: { padding: '4px 0', ':last-child': { paddingRight: 0 } },
  },
  option: { width: '23%', '@media print': { width: '30%' } },
  schedule: { width: '78px', textAlign: 'center' },
  power: { width: '80px', textAlign: 'end' },
  figure: { width: '70px', textAlign: 'end' },
  standing: { width: '23%', paddingLeft: '16px', [narrow]: { width: 'auto', paddingLeft: 0 } },
  rows: { [narrow]: { display: 'block' } },
});

interface BeamsProps {
  weighing: Weighing;
  measures: readonly Measure[];
  measure: Measure;
  scale: number;
  /** The option that the others are told against. */
  reference: Weighed | undefined;
  selected: string | undefined;
  onSelect: (optionId: string) => void;
}

/** The options as rows, each with its beam; arrow keys go from row to row, Enter or the space bar chooses one. */
export function Beams({ measures, selected, onSelect, ...shown }: BeamsProps) {
  const styles = useStyles();
  const { show } = useWeighView();
  const { options } = shown.weighing;
  const rows = useRef<HTMLTableSectionElement>(null);
  const sized = options.filter(sizeOf);

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
        <tr className={styles.headRow}>
          <th className={mergeClasses(styles.head, styles.plain, styles.option)}>
            <Word is="option">Option</Word>
          </th>
          <th className={mergeClasses(styles.head, styles.plain, styles.schedule)}>Schedule</th>
          <th className={styles.head}>
            <HeadSelect
              label="Beams show"
              value={shown.measure.key}
              choices={measures.map(({ key, title }) => ({ value: key, label: title }))}
              onChoose={(beams) => show({ beams })}
            />
          </th>
          <th className={mergeClasses(styles.head, styles.plain, styles.power)}>Power</th>
          <th className={mergeClasses(styles.head, styles.plain, styles.figure)}>Cost</th>
          <th className={mergeClasses(styles.head, styles.plain, styles.figure)}>Months</th>
          <th className={mergeClasses(styles.head, styles.standing)}>
            <HeadSelect
              label="Told"
              value={shown.reference?.id ?? limits}
              choices={[
                { value: limits, label: 'Against the limits' },
                ...sized.map(({ id, letter }) => ({ value: id, label: `Against ${letter}` })),
              ]}
              onChoose={(id) => show({ against: id === limits ? undefined : id })}
            />
          </th>
        </tr>
      </thead>
      <tbody ref={rows} className={styles.rows} onKeyDown={onKeyDown}>
        {options.map((option) => (
          <BeamRow
            key={option.id}
            option={option}
            {...shown}
            selected={option.id === selected}
            onSelect={() => onSelect(option.id)}
          />
        ))}
      </tbody>
    </table>
  );
}

/** What the last column is told against where no option is chosen. */
const limits = 'limits';

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
