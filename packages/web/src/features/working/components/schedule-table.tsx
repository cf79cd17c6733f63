import { makeStyles, mergeClasses } from '@fluentui/react-components';
import { DataTable } from '../../../shared/ui/data-table';
import { cellName, Schedule, sequenceName } from '../../designs/components/schedule';
import type { Schematic } from '../../designs/families/family-ui';

const useStyles = makeStyles({
  both: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '12px 28px' },
  table: { flexGrow: 1, maxWidth: '560px', minWidth: 0 },
  long: { flexBasis: '560px', maxWidth: '100%' },
});

/** The schedule as a picture and as a table. */
export function ScheduleTable(props: { schematic: Schematic; arms: readonly string[]; hue: string }) {
  const styles = useStyles();
  const { schematic, arms, hue } = props;
  const { periods, sequences } = schematic;
  const long = periods.length > 4;
  return (
    <div className={styles.both}>
      <Schedule schematic={schematic} arms={arms} hue={hue} width={96} height={54} />
      <div className={mergeClasses(styles.table, long && styles.long)}>
        <DataTable
          label="Schedule"
          scrolls={long}
          columns={[{ label: 'Randomised to' }, ...periods.map((label) => ({ label }))]}
          rows={sequences.map((sequence) => ({
            key: sequence.name,
            cells: [sequenceName(sequence), ...sequence.cells.map((cell) => cellName(cell, arms))],
          }))}
        />
      </div>
    </div>
  );
}
